import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { buildLoop, loopAt } from '@/analysis';
import { caseLoop } from '@/analysis/project';
import type { ChartDesign } from '@/components/charts';
import type { KeptAnalysis } from '@/contract';
import { analysisQuery, caseAnalysisQuery } from '@/hooks/queries/analyses';

/** The frozen loop of one case at any frequency, for the cursor. */
function frozenLoop({ inputs }: KeptAnalysis, caseId: string): ChartDesign['at'] {
  const frozen = inputs.cases.find(({ id }) => id === caseId) ?? inputs.cases[0];
  const model = buildLoop(caseLoop(frozen, inputs.design));
  return loopAt(model);
}

export interface CaseChoice {
  projectId: string;
  analysisId: string;
  /** The first case where absent. */
  caseId?: string;
}

/** A kept analysis and the curves of one of its cases, ready for the charts. */
export function useCaseCurves({ projectId, analysisId, caseId }: CaseChoice) {
  const kept = useQuery(analysisQuery(projectId, analysisId));
  const chosen = caseId ?? kept.data?.results[0]?.case.id;
  const curves = useQuery({ ...caseAnalysisQuery(projectId, analysisId, chosen ?? ''), enabled: chosen !== undefined });
  const design = useMemo<ChartDesign | null>(() => {
    if (!kept.data || !curves.data || !chosen) return null;
    const { name, revision } = kept.data.design;
    return { label: `${name}, rev ${revision}`, analysis: curves.data, at: frozenLoop(kept.data, chosen) };
  }, [kept.data, curves.data, chosen]);
  return { kept, curves, design, caseId: chosen };
}
