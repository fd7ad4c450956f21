import type { Rows } from '../row';
import { ownCase } from './own';

const lists = [{ axis: 'speed', points: [{ at: 20 }] }];

export const caseRows: Rows = {
  'GET /api/projects/{projectId}/cases': { needs: 'read' },
  'POST /api/projects/{projectId}/cases': { needs: 'edit', body: ({ plantId }) => ({ name: 'Full tank', plantId }) },
  'POST /api/projects/{projectId}/cases/grid': { needs: 'edit', body: ({ plantId }) => ({ plantId, lists }) },
  'GET /api/projects/{projectId}/cases/{caseId}': { needs: 'read' },
  'PATCH /api/projects/{projectId}/cases/{caseId}': { needs: 'edit', body: ({ plantId }) => ({ plantId }) },
  'DELETE /api/projects/{projectId}/cases/{caseId}': { needs: 'edit', prepare: ownCase },
};
