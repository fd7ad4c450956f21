import { useEffect } from 'react';
import { useRestedOverCases } from './use-rested-over-cases';

/** Tells which case is nearest its limit once the gains rest, so that its curves can be shown. */
export function FollowWorst({ onWorst }: { onWorst: (caseId: string) => void }) {
  const worst = useRestedOverCases()?.answer.headline.case?.id;
  useEffect(() => {
    if (worst !== undefined) onWorst(worst);
  }, [worst, onWorst]);
  return null;
}
