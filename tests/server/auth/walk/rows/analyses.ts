import { aDesign } from '../../../../support/a-project';
import type { Rows } from '../row';

const { name: _name, ...content } = aDesign;

export const analysisRows: Rows = {
  'GET /api/projects/{projectId}/analyses': { needs: 'read' },
  'POST /api/projects/{projectId}/analyses': { needs: 'edit', body: ({ designId, caseId }) => ({ designId, caseIds: [caseId] }) },
  'GET /api/projects/{projectId}/analyses/{analysisId}': { needs: 'read' },
  'GET /api/projects/{projectId}/analyses/{analysisId}/cases/{caseId}': { needs: 'read' },
  'POST /api/projects/{projectId}/analyses/{analysisId}/recompute': { needs: 'read' },
  'GET /api/projects/{projectId}/conditions': { needs: 'read' },
  'POST /api/projects/{projectId}/judge': { needs: 'read', body: ({ caseId }) => ({ ...content, caseIds: [caseId] }) },
};
