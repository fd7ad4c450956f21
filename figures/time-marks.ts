import type { TimeMetrics } from '@/contract';
import { formatFactor, formatNumber, formatSeconds, withUnit } from './format';
import { boxAround } from './label-board';
import type { PanelPicture } from './panel';
import { placesAround } from './place-label';
import type { TimeGround } from './time-demands';

const LEAST_OVERSHOOT = 0.5;

/** The response at a time; null outside it. */
export type ValueAt = (time: number) => number | null;

export type TimeMarks = Pick<PanelPicture, 'bars' | 'dots'>;

/** When the response settles and how far it overshoots. */
export function referenceMarks(metrics: TimeMetrics, { across, up, board }: TimeGround, values: ValueAt): TimeMarks {
  const marks = { bars: [] as PanelPicture['bars'][number][], dots: [] as PanelPicture['dots'][number][] };
  const { finalValue, settlingTime, overshootPercent, peakTime } = metrics;
  if (finalValue !== null && settlingTime !== null && settlingTime <= across.domain[1]) {
    const x = across.at(settlingTime);
    const from = up.at(values(settlingTime) ?? finalValue);
    const to = from + (finalValue >= 0 ? 36 : -36);
    marks.bars.push({ x, from, to, disc: false });
    board.reserve({ x: x - 2, y: Math.min(from, to), width: 4, height: 36 });
    const heights = [to, (from + to) / 2 + 8];
    const places = heights.flatMap((y) => [
      { x: x + 5, y, anchor: 'start' as const },
      { x: x - 5, y, anchor: 'end' as const },
    ]);
    board.add([`settles ${formatSeconds(settlingTime)} s`], 'strong', places);
  }
  if (finalValue !== null && overshootPercent !== null && overshootPercent > LEAST_OVERSHOOT && peakTime !== null) {
    const dot = { x: across.at(peakTime), y: up.at(finalValue * (1 + overshootPercent / 100)), radius: 4 };
    marks.dots.push(dot);
    board.reserve(boxAround(dot.x, dot.y, 5));
    board.add([`overshoot ${formatNumber(overshootPercent, 1)} %`], 'strong', placesAround(dot, [12, 18, 26]));
  }
  return marks;
}

/** How far a load takes the output. */
export function loadMarks(metrics: TimeMetrics, { across, up, board }: TimeGround, values: ValueAt, unit: string): TimeMarks {
  const value = metrics.loadPeakTime === null ? null : values(metrics.loadPeakTime);
  if (metrics.loadPeakTime === null || value === null) return { bars: [], dots: [] };
  const dot = { x: across.at(metrics.loadPeakTime), y: up.at(value), radius: 4 };
  board.reserve(boxAround(dot.x, dot.y, 5));
  board.add([withUnit(`peak ${formatFactor(value)}`, unit)], 'strong', placesAround(dot, [14, 20, 30, 42]));
  return { bars: [], dots: [dot] };
}
