import type { Verdict } from '@/contract';
import type { Palette } from '@/components/ui/tokens';

export interface CellLook {
  readonly ground: string;
  readonly bar: string;
}

/** A cell's ground and the colour of the bar at its foot. A number that nothing is demanded of looks like one that passes. */
export function cellLook(verdict: Verdict | null, colors: Palette): CellLook {
  if (verdict === 'tight') return { ground: colors.tightTint, bar: colors.tight };
  if (verdict === 'fail') return { ground: colors.failTint, bar: colors.fail };
  return { ground: colors.paper, bar: colors.rule2 };
}
