import type { NewAnalysis } from '@/db/stores/analysis-store';

/** How far an analysis reaches, as the history says it. */
export const overCases = ({ results }: Pick<NewAnalysis, 'results'>) =>
  results.length === 1 ? 'over one case' : `over ${results.length} cases`;
