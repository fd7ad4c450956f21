import { useLocalSearchParams, useRouter } from 'expo-router';
import { useCallback, useMemo } from 'react';
import { type BenchLink, benchLink, type ChangeLink, type Parameter, type Parameters } from './bench-link';

/** The address of this bench, and the way to change it. */
export function useBenchLink(): [BenchLink, ChangeLink] {
  const {
    design,
    revision: rev,
    analysis,
    case: caseId,
    chart,
    b,
    step: reference,
    load,
  } = useLocalSearchParams<Record<Parameter, string>>();
  const router = useRouter();
  const link = useMemo(
    () => benchLink({ design, revision: rev, analysis, case: caseId, chart, b, step: reference, load }),
    [design, rev, analysis, caseId, chart, b, reference, load],
  );
  const change = useCallback((next: Parameters) => router.setParams(next), [router]);
  return [link, change];
}
