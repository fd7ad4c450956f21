import { aPlant } from '../../../../support/a-project';
import type { Rows } from '../row';
import { ownPlant } from './own';

export const plantRows: Rows = {
  'POST /api/plants/read': { needs: 'session', body: () => ({ plant: aPlant.plant }) },
  'GET /api/projects/{projectId}/plants': { needs: 'read' },
  'POST /api/projects/{projectId}/plants': { needs: 'edit', body: () => aPlant },
  'GET /api/projects/{projectId}/plants/{plantId}': { needs: 'read' },
  'GET /api/projects/{projectId}/plants/{plantId}/revisions': { needs: 'read' },
  'POST /api/projects/{projectId}/plants/{plantId}/revisions': {
    needs: 'edit',
    prepare: ownPlant,
    body: () => ({ plant: aPlant.plant, baseRevision: 1 }),
  },
  'GET /api/projects/{projectId}/plants/{plantId}/revisions/{revision}': { needs: 'read' },
};
