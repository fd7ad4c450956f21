import type { CaseRef, DesignContent, FrozenCase, Limit } from '@/contract';
import type { Detail } from '@/analysis/margins/search-grid';
import { breachOf, type Breach } from './breach';
import { caseLoop } from './case-loop';
import { firstBreak } from './first-break';

/** Where a value, turned one way, breaks something first: it holds at `holds` and no longer at `breaks`. */
export interface Mark extends Breach {
  readonly holds: number;
  readonly breaks: number;
  readonly case: CaseRef;
}

export interface Marks {
  /** The first limit to break; null where none does before `to`. */
  readonly limit: Mark | null;
  /** Where the first case is no longer stable; null where every case is, as far as `to`. */
  readonly instability: Mark | null;
}

export interface MarksQuestion {
  /** The design with the value turned to this: kp, ki, Tf or whatever the rule moves. */
  readonly designAt: (value: number) => DesignContent;
  readonly from: number;
  readonly to: number;
  /** The likeliest to break first: those whose use is greatest now. */
  readonly cases: readonly FrozenCase[];
  readonly limits: readonly Limit[];
  readonly detail?: Detail;
}

/**
 * What a value breaks when it is turned from where it stands towards `to`: the first limit, and where stability ends.
 * @see firstBreak
 */
export function marksAlong({ designAt, from, to, cases, limits, detail }: MarksQuestion): Marks {
  const valueAt = (share: number) => from + share * (to - from);
  const first = (demands: readonly Limit[]): Mark | null => {
    const found = firstBreak(cases, (one, share) => breachOf(caseLoop(one, designAt(valueAt(share))), demands, detail));
    if (!found) return null;
    const { id, name } = found.case;
    return { holds: valueAt(found.holds), breaks: valueAt(found.breaks), ...found.what, case: { id, name } };
  };
  return { limit: limits.length === 0 ? null : first(limits), instability: first([]) };
}
