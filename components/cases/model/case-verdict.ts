import type { Verdict } from '@/contract';
import type { CaseView } from './case-view';

/** What a case is worth as it stands now: one that changed since, or that nobody analysed, is not judged. */
export const caseVerdict = ({ result, outdated }: CaseView): Verdict => (result === null || outdated ? 'notJudged' : result.verdict);

/** Why a case is not judged, in words; null where it is. */
export function whyNotJudged({ result, outdated }: CaseView): string | null {
  if (result === null) return 'Not analysed yet.';
  if (outdated) return 'Changed since it was analysed: these are the numbers of before.';
  return result.reason;
}
