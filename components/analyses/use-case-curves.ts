import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { buildLoop, loopAt, withResponses } from '@/analysis';
import { caseLoop } from '@/analysis/project';
import type { ChartDesign } from '@/components/charts';
import type { Analysis, KeptAnalysis } from '@/contract';
import { timeWindow } from '@/figures';
import { analysisQuery, caseAnalysisQuery } from '@/hooks/queries/analyses';

/** The frozen loop of one case, for the cursor at any frequency, and its responses until the end of the axis that they share. */
function frozenDesign({ inputs, design }: KeptAnalysis, caseId: string, analysis: Analysis): ChartDesign {
  const frozen = inputs.cases.find(({ id }) => id === caseId) ?? inputs.cases[0];
  const loop = caseLoop(frozen, inputs.design);
  const [, duration] = timeWindow(analysis);
  const shown = analysis.closedLoop.stable ? withResponses(analysis, { ...loop, responses: { ...loop.responses, duration } }) : analysis;
  return { label: `${design.name}, rev ${design.revision}`, analysis: shown, at: loopAt(buildLoop(loop)) };
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
    return frozenDesign(kept.data, chosen, curves.data);
  }, [kept.data, curves.data, chosen]);
  return { kept, curves, design, caseId: chosen };
}
