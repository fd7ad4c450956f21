import type { Point, Rect } from './geometry';
import { type StraightKerb, straightKerb } from './kerb';
import { type LapDemand, type LapName, lapNames } from './lap-labels';
import { boxAround, createLabelBoard } from './label-board';
import { type Axis, finiteExtent, linearScale } from './linear-axis';
import type { PanelLabel } from './panel';
import { type LabelPlace, placesAround } from './place-label';
import { type Polyline, polylinePath } from './polyline';
import { textWidth } from './text-width';
import { valueAxis } from './value-axis';

/** One case: where it stands on the axis, and its number; null where it has none. Both in the reader's units. */
export interface LapPoint {
  readonly at: number;
  readonly value: number | null;
}

/** Cases of one load, in the order of the axis. */
export interface LapLine {
  readonly name: string;
  readonly points: readonly LapPoint[];
}

export interface LapChartInput {
  readonly width: number;
  readonly height: number;
  readonly lines: readonly LapLine[];
  readonly demands: readonly LapDemand[];
  /** The point singled out, with what is written beside it. */
  readonly worst: { readonly line: number; readonly point: number; readonly text: readonly string[] } | null;
  /** What lies beyond either end, in words: "not checked". null: the axis ends where the cases do. */
  readonly beyond: { readonly low: string | null; readonly high: string | null };
  readonly tickText: (at: number) => string;
}

export interface LapPicture {
  readonly plot: Rect;
  readonly axis: Axis;
  /** The places of the cases; text null where there is no room for it. */
  readonly columns: readonly { readonly x: number; readonly text: string | null }[];
  /** What lies beyond the checked range; its words are among the labels. */
  readonly beyond: readonly Rect[];
  readonly kerbs: readonly StraightKerb[];
  readonly lines: readonly { readonly path: string; readonly discs: readonly Point[]; readonly strong: boolean }[];
  readonly names: readonly LapName[];
  readonly worst: Point | null;
  readonly labels: readonly PanelLabel[];
}

const MARGIN = { left: 44, top: 26, foot: 28, name: 12 };
const WIDEST_NAME = 110;
/** Pixels of a region beyond the cases, and without one. */
const BEYOND = 56;
const INSET = 10;
const TICK_GAP = 8;
const LINE = 16;
/** Round the point that is singled out. */
const RING = 9;

function columnsOf(places: readonly number[], across: (at: number) => number, tickText: LapChartInput['tickText']) {
  let free = -Infinity;
  return places.map((at) => {
    const x = across(at);
    const half = textWidth(tickText(at)) / 2;
    if (x - half < free) return { x, text: null };
    free = x + half + TICK_GAP;
    return { x, text: tickText(at) };
  });
}

function frame({ width, height, lines, demands, beyond }: LapChartInput) {
  const texts = [...lines.map(({ name }) => name), ...demands.map(({ text }) => text)];
  const right = MARGIN.name + Math.min(WIDEST_NAME, Math.max(0, ...texts.map((text) => textWidth(text))));
  const plot = {
    x: MARGIN.left,
    y: MARGIN.top,
    width: Math.max(1, width - MARGIN.left - right),
    height: Math.max(1, height - MARGIN.top - MARGIN.foot),
  };
  const places = [...new Set(lines.flatMap(({ points }) => points.map(({ at }) => at)))].sort((a, b) => a - b);
  const [first, last] = [places[0] ?? 0, places[places.length - 1] ?? 0];
  const ends: [number, number] = [
    plot.x + (beyond.low === null ? INSET : BEYOND),
    plot.x + plot.width - (beyond.high === null ? INSET : BEYOND),
  ];
  return { plot, places, ends, across: linearScale([first, last], ends) };
}

function beyondRects({ x, y, width, height }: Rect, [low, high]: readonly [number, number], { beyond, lines }: LapChartInput) {
  if (lines.length === 0) return [];
  const right = x + width;
  return [
    ...(beyond.low === null ? [] : [{ rect: { x, y, width: low - x, height }, text: beyond.low }]),
    ...(beyond.high === null ? [] : [{ rect: { x: high, y, width: right - high, height }, text: beyond.high }]),
  ];
}

/** At the foot of a region, else higher up in it. */
function placesInside({ x, y, height }: Rect, lines: number): LabelPlace[] {
  const first = y + height - 8 - (lines - 1) * LINE;
  return [0, 0.33, 0.6, 0.85].map((share) => ({ x: x + 8, y: first - share * height, anchor: 'start' }));
}

/**
 * One number of every case over speed, or over whatever the cases are laid along: a line for each load, what is demanded as a
 * kerb, the worst singled out, and what was not checked beyond the ends.
 */
export function lapChart(input: LapChartInput): LapPicture {
  const { lines, demands, worst } = input;
  const { plot, places, ends, across } = frame(input);
  const values = [...lines.flatMap(({ points }) => points.flatMap(({ value }) => value ?? [])), ...demands.map(({ limit }) => limit)];
  const axis = valueAxis(finiteExtent(values) ?? [0, 1], [plot.y + plot.height, plot.y]);
  const drawn = lines.map(({ points }) => points.map(({ at, value }) => ({ x: across(at), y: value === null ? NaN : axis.at(value) })));
  const polylines = drawn.map((points): Polyline => ({
    x: points.map(({ x }) => x),
    y: points.map(({ y }) => y),
  }));
  const kerbs = demands.map(({ bound, limit }) => {
    const y = axis.at(limit);
    return straightKerb({ from: { x: plot.x, y }, to: { x: plot.x + plot.width, y }, side: bound === 'max' ? 'left' : 'right' });
  });
  const regions = beyondRects(plot, ends, input);
  const at = worst === null ? null : drawn[worst.line][worst.point];
  const board = createLabelBoard({ bounds: plot, curves: polylines, shaded: regions.map(({ rect }) => rect) });
  if (at !== null) board.reserve(boxAround(at.x, at.y, RING));
  for (const { limit } of demands) board.reserve({ x: plot.x, y: axis.at(limit) - 8, width: plot.width, height: 16 });
  if (worst !== null && at !== null) board.add(worst.text, 'strong', placesAround(at, [16, 28, 44, 64]));
  for (const { rect, text } of regions) board.add(text.split(' '), 'quiet', placesInside(rect, text.split(' ').length));
  return {
    plot,
    axis,
    columns: columnsOf(places, across, input.tickText),
    beyond: regions.map(({ rect }) => rect),
    kerbs,
    lines: drawn.map((points, i) => ({
      path: polylinePath(polylines[i], plot),
      discs: points.filter(({ y }) => Number.isFinite(y)),
      strong: i === worst?.line,
    })),
    names: lapNames({ lines: drawn.map((points, i) => ({ points, name: lines[i].name, strong: i === worst?.line })), demands, axis, plot }),
    worst: at,
    labels: board.labels,
  };
}
