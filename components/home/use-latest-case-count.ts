import { useInfiniteQuery } from '@tanstack/react-query';
import { useProject } from '@/components/navigation/project-context';
import { analysesQuery } from '@/hooks/queries/analyses';

/** Over how many cases the newest analysis was computed; null until that is known. */
export function useLatestCaseCount(): number | null {
  const { id, latestAnalysis } = useProject();
  const { data } = useInfiniteQuery(analysesQuery(id));
  return data?.find((analysis) => analysis.id === latestAnalysis?.id)?.caseCount ?? null;
}
