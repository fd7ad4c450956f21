import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useProject } from '@/components/navigation/project-context';
import type { WorstCheck } from '@/components/verdict/worst-checks';
import { analysisQuery } from '@/hooks/queries/analyses';
import { demandOf, type DemandRow, keyOf } from './model/demand-row';
import { standings } from './model/standings';

/** Where the newest kept analysis stands to what the rows say, while they are typed. */
export function useStandings(rows: readonly DemandRow[]) {
  const { id, latestAnalysis } = useProject();
  const { data: analysis } = useQuery({ ...analysisQuery(id, latestAnalysis?.id ?? ''), enabled: latestAnalysis !== null });
  const byKey = useMemo(() => {
    if (!analysis) return new Map<string, WorstCheck>();
    const demands = rows.flatMap((row) => demandOf(row) ?? []);
    return new Map(standings(analysis, demands).map((worst) => [keyOf(worst.check), worst]));
  }, [analysis, rows]);
  return {
    analysis: analysis ?? null,
    revision: latestAnalysis ? `rev ${latestAnalysis.design.revision}` : null,
    standingOf: (row: DemandRow) => byKey.get(keyOf(row)),
  };
}
