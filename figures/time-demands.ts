import { formatFactor, shortNumber } from './format';
import { clamp, type Rect } from './geometry';
import { straightKerb, type StraightKerb } from './kerb';
import type { LabelBoard } from './label-board';
import type { Axis } from './linear-axis';
import type { LoopScene } from './loop-picture';
import type { TimeAxis } from './time-axis';

/** What marks of a time panel are put on. */
export interface TimeGround {
  readonly across: TimeAxis;
  readonly up: Axis;
  readonly plot: Rect;
  readonly board: LabelBoard;
}

/** Settling is judged within this fraction of the final value. */
const CORRIDOR = 0.02;

/** Overshoot ceiling until the settling limit, then the corridor round the final value. */
export function responseKerbs({ limits }: LoopScene, final: number, { across, up, plot, board }: TimeGround): StraightKerb[] {
  const { overshootPercent: overshoot, settlingTime: settling } = limits ?? {};
  const end = plot.x + plot.width;
  const turn = settling === undefined ? end : clamp(across.at(settling), plot.x, end);
  const strip = (from: number, to: number, value: number, outer: boolean) => {
    const y = up.at(value);
    const above = outer === final >= 0;
    board.reserve({ x: from, y: y - 6, width: to - from, height: 12 });
    return straightKerb({ from: { x: from, y }, to: { x: to, y }, thickness: 4, block: 8, side: above ? 'left' : 'right' });
  };
  const kerbs: StraightKerb[] = [];
  if (overshoot !== undefined && turn > plot.x) kerbs.push(strip(plot.x, turn, final * (1 + overshoot / 100), true));
  if (settling !== undefined && turn < end)
    kerbs.push(strip(turn, end, final * (1 + CORRIDOR), true), strip(turn, end, final * (1 - CORRIDOR), false));
  if (settling !== undefined) {
    const y = up.at(final);
    // Before the limit stands what the response does: beyond it there is room, as long as the axis goes on.
    board.add([`by ${shortNumber(settling, 3)} s within 2 %`], 'limit', [
      { x: turn + 6, y: y + 22, anchor: 'start' },
      { x: turn - 6, y: y + 22, anchor: 'end' },
      { x: turn - 6, y: y + 40, anchor: 'end' },
    ]);
  }
  return kerbs;
}

/** The actuator's limits, blocks outwards. */
export function controlKerbs({ limits }: LoopScene, { up, plot, board }: TimeGround): StraightKerb[] {
  const ends = [
    { value: limits?.controlMaximum, side: 'left', baseline: 16 },
    { value: limits?.controlMinimum, side: 'right', baseline: -6 },
  ] as const;
  return ends.flatMap(({ value, side, baseline }) => {
    if (value === undefined || value < up.domain[0] || value > up.domain[1]) return [];
    const y = up.at(value);
    const right = plot.x + plot.width;
    board.reserve({ x: plot.x, y: y - 5, width: plot.width, height: 10 });
    board.add([`actuator ${formatFactor(value)}`], 'limit', [
      { x: right - 4, y: y + baseline, anchor: 'end' },
      { x: plot.x + 4, y: y + baseline, anchor: 'start' },
    ]);
    return [straightKerb({ from: { x: plot.x, y }, to: { x: right, y }, thickness: 5, block: 9, side })];
  });
}
