import type { TimeMetrics, TimeSeries } from '@/contract';
import { formatFactor, formatNumber, formatSeconds, withUnit } from './format';
import { clamp, type Interval, type Rect } from './geometry';
import { interpolateAt } from './interpolate';
import { straightKerb, type StraightKerb } from './kerb';
import { boxAround, createLabelBoard, type LabelBoard } from './label-board';
import { type Axis, finiteExtent } from './linear-axis';
import type { ChartDesign, LoopScene } from './loop-picture';
import type { PanelPicture } from './panel';
import { placesAround } from './place-label';
import { type Polyline, polylinePath, toPolyline } from './polyline';
import type { TimeAxis } from './time-axis';
import { valueAxis } from './value-axis';

/** One panel of a time sheet; its title says what is shown after what ("Speed after a 1 m/s step"). */
export interface TimePanel {
  kind: 'reference' | 'load' | 'control';
  title: string;
  unit: string;
  height?: number;
}

/** Settling is judged within this fraction of the final value. */
const CORRIDOR = 0.02;
const LEAST_OVERSHOOT = 0.5;

/** The series that a panel shows; null where the loop gives no time response. */
export function timeSeriesOf(
  { analysis }: Pick<ChartDesign, 'analysis'>,
  kind: TimePanel['kind'],
): { time: number[]; values: number[] } | null {
  const series: TimeSeries | undefined = kind === 'load' ? analysis.timeResponse?.load : analysis.timeResponse?.reference;
  if (series === undefined) return null;
  return { time: series.time, values: kind === 'control' ? series.control : series.output };
}

interface Frame {
  across: TimeAxis;
  up: Axis;
  plot: Rect;
  board: LabelBoard;
}

/** Overshoot ceiling until the settling limit, then the corridor round the final value. */
function demandKerbs({ limits }: LoopScene, final: number, { across, up, plot, board }: Frame): StraightKerb[] {
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
    board.add([`by ${formatNumber(settling, 0)} s within 2 %`], 'limit', [
      { x: turn - 6, y: y + 22, anchor: 'end' },
      { x: turn - 6, y: y + 40, anchor: 'end' },
    ]);
  }
  return kerbs;
}

type Marks = Pick<PanelPicture, 'bars' | 'dots'>;

function referenceMarks(metrics: TimeMetrics, { across, up, board }: Frame, values: (t: number) => number | null): Marks {
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

function loadMarks(metrics: TimeMetrics, { across, up, board }: Frame, values: (t: number) => number | null, unit: string): Marks {
  const value = metrics.loadPeakTime === null ? null : values(metrics.loadPeakTime);
  if (metrics.loadPeakTime === null || value === null) return { bars: [], dots: [] };
  const dot = { x: across.at(metrics.loadPeakTime), y: up.at(value), radius: 4 };
  board.reserve(boxAround(dot.x, dot.y, 5));
  board.add([withUnit(`peak ${formatFactor(value)}`, unit)], 'strong', placesAround(dot, [14, 20, 30, 42]));
  return { bars: [], dots: [dot] };
}

function controlKerbs({ limits }: LoopScene, { up, plot, board }: Frame): StraightKerb[] {
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
      { x: right, y: y + baseline, anchor: 'end' },
      { x: plot.x + 4, y: y + baseline, anchor: 'start' },
    ]);
    return [straightKerb({ from: { x: plot.x, y }, to: { x: right, y }, thickness: 5, block: 9, side })];
  });
}

function verticalExtent(scene: LoopScene, kind: TimePanel['kind'], final: number | null): Interval {
  const values = [scene.a, scene.b].flatMap((design) => (design === undefined ? [] : (timeSeriesOf(design, kind)?.values ?? [])));
  const [low, high] = finiteExtent(values) ?? [0, 1];
  const { overshootPercent, controlMaximum, controlMinimum } = scene.limits ?? {};
  const wanted = [0, low, high];
  if (kind === 'reference' && final !== null) wanted.push(final * (1 + (overshootPercent ?? 2) / 100 + 0.04));
  if (kind === 'control')
    wanted.push(
      ...[controlMaximum, controlMinimum]
        .filter((v) => v !== undefined && Math.abs(v) < 3 * Math.max(Math.abs(low), Math.abs(high)))
        .map(Number),
    );
  return [Math.min(...wanted), Math.max(...wanted)];
}

function timeLine(design: ChartDesign | undefined, kind: TimePanel['kind'], across: TimeAxis, up: Axis): Polyline | null {
  const series = design === undefined ? null : timeSeriesOf(design, kind);
  return series === null ? null : toPolyline(series.time, series.values, across.at, up.at);
}

/** One response over time, with what is read off it and what is demanded of it. */
export function timePanel(scene: LoopScene, { kind, title, unit }: TimePanel, across: TimeAxis, plot: Rect): PanelPicture {
  const metrics = scene.a.analysis.timeResponse?.metrics ?? null;
  const final = metrics?.finalValue ?? null;
  const up = valueAxis(verticalExtent(scene, kind, final), [plot.y + plot.height, plot.y]);
  const a = timeLine(scene.a, kind, across, up);
  const b = timeLine(scene.b, kind, across, up);
  const board = createLabelBoard({ bounds: plot, curves: [a, b].filter((line) => line !== null) });
  const frame = { across, up, plot, board };
  const series = timeSeriesOf(scene.a, kind);
  const values = (t: number) => (series === null ? null : interpolateAt(series.time, series.values, t));
  const kerbs =
    kind === 'control' ? controlKerbs(scene, frame) : kind === 'reference' && final !== null ? demandKerbs(scene, final, frame) : [];
  const marks =
    metrics === null || kind === 'control'
      ? { bars: [], dots: [] }
      : kind === 'load'
        ? loadMarks(metrics, frame, values, unit)
        : referenceMarks(metrics, frame, values);
  const path = (line: Polyline | null) => (line === null ? '' : polylinePath(line, plot));
  const curves = { a: path(a), b: path(b), secondA: '', secondB: '', others: '' };
  const strong = kind === 'reference' && final !== null && final !== 0 ? [0, final] : [0];
  return { title, unit, plot, axis: up, strong, curves, kerbs, ...marks, labels: board.labels };
}
