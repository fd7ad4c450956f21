import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useProject } from '@/components/navigation/project-context';
import type { WorstCheck } from '@/components/verdict/worst-checks';
import { analysisQuery } from '@/hooks/queries/analyses';
import type { CheckedRows } from './model/check-rows';
import { demandOf, type DemandRow, keyOf } from './model/demand-row';
import { standings } from './model/standings';

/** Where the newest kept analysis stands to what the rows say, while they are typed; nowhere to a row with something wrong in it. */
export function useStandings(rows: readonly DemandRow[], { errors }: CheckedRows) {
  const { id, latestAnalysis } = useProject();
  const { data: analysis } = useQuery({ ...analysisQuery(id, latestAnalysis?.id ?? ''), enabled: latestAnalysis !== null });
  const byKey = useMemo(() => {
    if (!analysis) return new Map<string, WorstCheck>();
    const isSound = (index: number) => !errors[index].limit && !errors[index].target;
    const demands = rows.flatMap((row, index) => (isSound(index) && demandOf(row)) || []);
    return new Map(standings(analysis, demands).map((worst) => [keyOf(worst.check), worst]));
  }, [analysis, rows, errors]);
  return {
    analysis: analysis ?? null,
    revision: latestAnalysis ? `rev ${latestAnalysis.design.revision}` : null,
    standingOf: (row: DemandRow) => byKey.get(keyOf(row)),
  };
}
