import type { Me, Project } from '@/contract';
import { addMember } from '@/db/stores/member-store';
import { made } from '../../../../support/a-project';
import { idOf } from '../../../../support/members';
import type { Rows } from '../row';
import { memberRoles } from '../world';

const name = 'For a moment';

export const projectRows: Rows = {
  'GET /api/projects': { needs: 'session' },
  'POST /api/projects': {
    needs: 'session',
    prepare: async (_world, caller) => ({ teamId: (await caller.call<Me>('GET', '/api/me')).body.teams[0].id }),
    body: ({ teamId }) => ({ name, teamId }),
  },
  'GET /api/projects/{projectId}': { needs: 'read' },
  'PATCH /api/projects/{projectId}': { needs: 'edit', body: () => ({ description: 'Holds the speed.' }) },
  'DELETE /api/projects/{projectId}': {
    needs: 'manage',
    prepare: async ({ app, cast }) => {
      const { id: projectId } = await made<Project>(cast.owner, '/api/projects', { name });
      for (const role of memberRoles.slice(1)) addMember(app.db, { projectId, userId: await idOf(cast[role]), role }, new Date());
      return { projectId };
    },
    body: () => ({ confirmName: name }),
  },
  'GET /api/projects/{projectId}/activity': { needs: 'read' },
};
