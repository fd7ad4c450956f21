import type { Mark } from '@/analysis/project';
import { type GainEdge, type GainStretch, quantityName, type UnstableGains } from '@/figures';
import type { MarkSide } from './mark-walk';

/** What a gain breaks, turned one way. */
export interface SideMarks {
  readonly limit: Mark | null;
  readonly instability: Mark | null;
}

export type GainMarks = Readonly<Partial<Record<MarkSide, SideMarks>>>;

/** As the rule of a gain draws them. */
export interface RuleMarks {
  readonly stretch?: GainStretch;
  readonly unstable?: UnstableGains;
}

/** What does not hold already has no place on the rule: nothing is claimed of the values around. */
const ahead = (mark: Mark | null): Mark | null => (mark !== null && mark.holds === mark.breaks ? null : mark);
const isBroken = (mark: Mark | null) => mark !== null && ahead(mark) === null;

function edge(mark: Mark | null): GainEdge | undefined {
  if (!mark) return undefined;
  return { value: mark.holds, name: mark.quantity === null ? 'Unstable' : quantityName(mark.quantity), case: mark.case.name };
}

/** Both sides as the rule draws them: the stretch in which every limit holds, and where the first case is no longer stable. */
export function ruleMarks({ down, up }: GainMarks): RuleMarks {
  if (!down || !up) return {};
  const stretch = isBroken(down.limit) || isBroken(up.limit) ? undefined : { low: edge(down.limit), high: edge(up.limit) };
  return { stretch, unstable: { below: ahead(down.instability)?.breaks, above: ahead(up.instability)?.breaks } };
}
