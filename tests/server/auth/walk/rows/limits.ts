import type { Rows } from '../row';

export const limitRows: Rows = {
  'GET /api/projects/{projectId}/limits': { needs: 'read' },
  'PUT /api/projects/{projectId}/limits': {
    needs: 'edit',
    body: () => ({ items: [{ quantity: 'phaseMargin', bound: 'min', limit: 45, target: 50, source: 'team rule' }] }),
  },
};
