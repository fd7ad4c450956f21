import type { Interval, Rect } from './geometry';
import { interpolateAt } from './interpolate';
import type { StraightKerb } from './kerb';
import { createLabelBoard } from './label-board';
import { type Axis, finiteExtent } from './linear-axis';
import type { ChartDesign, LoopScene } from './loop-picture';
import type { PanelPicture } from './panel';
import { placementOf } from './placement';
import { type Polyline, polylinePath, toPolyline } from './polyline';
import { remember } from './remember';
import type { TimeAxis } from './time-axis';
import { controlKerbs, responseKerbs, type TimeGround } from './time-demands';
import { loadMarks, referenceMarks, type TimeMarks } from './time-marks';
import { type TimePanel, timeSeriesOf } from './time-series';
import { valueAxis } from './value-axis';

/** An actuator limit this many times the command is not drawn: it would flatten the curve. */
const FAR_LIMIT = 3;

function verticalExtent(scene: LoopScene, kind: TimePanel['kind'], final: number | null): Interval {
  const values = [scene.a, scene.b].flatMap((design) => (design === undefined ? [] : (timeSeriesOf(design, kind)?.values ?? [])));
  const [low, high] = finiteExtent(values) ?? [0, 1];
  const { overshootPercent, controlMaximum, controlMinimum } = scene.limits ?? {};
  const wanted = [0, low, high];
  if (kind === 'reference' && final !== null) wanted.push(final * (1 + (overshootPercent ?? 2) / 100 + 0.04));
  const largest = Math.max(Math.abs(low), Math.abs(high));
  const near = [controlMaximum, controlMinimum].filter((limit) => limit !== undefined && Math.abs(limit) < FAR_LIMIT * largest);
  if (kind === 'control') wanted.push(...near.map(Number));
  return [Math.min(...wanted), Math.max(...wanted)];
}

const lines = remember<readonly number[], Polyline>();

function timeLine(design: ChartDesign | undefined, kind: TimePanel['kind'], across: TimeAxis, up: Axis): Polyline | null {
  const series = design === undefined ? null : timeSeriesOf(design, kind);
  if (series === null) return null;
  const placement = [...placementOf(across), ...placementOf(up)];
  return lines(series.values, placement, () => toPolyline(series.time, series.values, across.at, up.at));
}

function kerbsOf(scene: LoopScene, kind: TimePanel['kind'], final: number | null, ground: TimeGround): StraightKerb[] {
  if (kind === 'control') return controlKerbs(scene, ground);
  return kind === 'reference' && final !== null ? responseKerbs(scene, final, ground) : [];
}

function marksOf(design: ChartDesign, { kind, unit }: Pick<TimePanel, 'kind' | 'unit'>, ground: TimeGround): TimeMarks {
  const metrics = design.analysis.timeResponse?.metrics ?? null;
  const series = timeSeriesOf(design, kind);
  if (metrics === null || series === null || kind === 'control') return { bars: [], dots: [] };
  const valueAt = (time: number) => interpolateAt(series.time, series.values, time);
  return kind === 'load' ? loadMarks(metrics, ground, valueAt, unit) : referenceMarks(metrics, ground, valueAt);
}

/** One response over time, with what is read off it and what is demanded of it. */
export function timePanel(scene: LoopScene, { kind, title, unit }: TimePanel, across: TimeAxis, plot: Rect): PanelPicture {
  const metrics = scene.a.analysis.timeResponse?.metrics ?? null;
  const final = metrics?.finalValue ?? null;
  const up = valueAxis(verticalExtent(scene, kind, final), [plot.y + plot.height, plot.y]);
  const a = timeLine(scene.a, kind, across, up);
  const b = timeLine(scene.b, kind, across, up);
  const board = createLabelBoard({ bounds: plot, curves: [a, b].filter((line) => line !== null) });
  const ground = { across, up, plot, board };
  const kerbs = kerbsOf(scene, kind, final, ground);
  const marks = marksOf(scene.a, { kind, unit }, ground);
  const path = (line: Polyline | null) => (line === null ? '' : polylinePath(line, plot));
  const curves = { a: path(a), b: path(b), secondA: '', secondB: '', others: '' };
  const strong = kind === 'reference' && final !== null && final !== 0 ? [0, final] : [0];
  return { title, unit, plot, axis: up, strong, curves, kerbs, ...marks, labels: board.labels };
}
