import { idOf } from '../../../../support/members';
import { aDesign, aPlant } from '../../../../support/a-project';
import type { Client } from '../../../../support/client';
import type { Row, Rows } from '../row';
import { finishedJob, type World } from '../world';

const ownJob: Row = {
  needs: 'session',
  prepare: async ({ app, ours }: World, caller: Client) => ({ jobId: await finishedJob(app, await idOf(caller), ours) }),
};

export const loopRows: Rows = {
  'POST /api/loops/analyse': { needs: 'session', body: () => ({ plant: aPlant.plant, controller: aDesign.controller }) },
  'GET /api/jobs/{jobId}': ownJob,
  'GET /api/jobs/{jobId}/events': ownJob,
  'DELETE /api/jobs/{jobId}': ownJob,
};
