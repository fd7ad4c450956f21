import { aDesign } from '../../../../support/a-project';
import type { Rows } from '../row';
import { ownDesign } from './own';

const { name: _name, ...content } = aDesign;

export const designRows: Rows = {
  'GET /api/projects/{projectId}/designs': { needs: 'read' },
  'POST /api/projects/{projectId}/designs': { needs: 'edit', body: () => aDesign },
  'GET /api/projects/{projectId}/designs/{designId}': { needs: 'read' },
  'GET /api/projects/{projectId}/designs/{designId}/revisions': { needs: 'read' },
  'POST /api/projects/{projectId}/designs/{designId}/revisions': {
    needs: 'edit',
    prepare: ownDesign,
    body: () => ({ ...content, baseRevision: 1, analyse: true }),
  },
  'GET /api/projects/{projectId}/designs/{designId}/revisions/{revision}': { needs: 'read' },
};
