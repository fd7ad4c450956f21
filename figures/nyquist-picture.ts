import { arrowheads } from './curve-marks';
import { clamp, type Point, type Rect, round2 } from './geometry';
import { circleKerb } from './kerb';
import { boxAround, createLabelBoard, type LabelBoard } from './label-board';
import { multiples } from './linear-axis';
import { type LoopScene, responseOf } from './loop-picture';
import { type NyquistView, nyquistView, type NyquistWindow } from './nyquist-window';
import { postMarks, worstMark } from './plane-marks';
import type { AxisLabel, ContourPaths, PlanePicture } from './plane-picture';
import { formatNumber } from './format';
import { type Polyline, polylinePath, toPolyline } from './polyline';
import { remember } from './remember';
import { contourLevels, contourPoint, contourRadius, legibleContours } from './sensitivity-contours';

const CONTOUR_PITCH = 5;
const LABEL_PITCH = 17;
const CONTOUR_POINTS = 48;
const LABEL_ANGLES = [112, 100, 124, 68, 80, 56, 146, 158, 248, 260, 236, 212, 292, 304];

const circlePath = ({ x, y }: Point, radius: number): string => {
  const r = round2(radius);
  return `M${round2(x - radius)} ${round2(y)}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`;
};

function contourPaths(summit: Point, pixelsPerUnit: number, limit: number | undefined): ContourPaths {
  const circle = (level: number) => circlePath(summit, contourRadius(level) * pixelsPerUnit);
  const all = legibleContours(
    [...contourLevels.fine, ...contourLevels.strong].sort((a, b) => a - b),
    pixelsPerUnit,
    CONTOUR_PITCH,
  );
  const isStrong = (level: number) => contourLevels.strong.some((strong) => strong === level);
  const shaded = contourLevels.shaded.map((level) => (level === 1.7 ? (limit ?? level) : level));
  return {
    shaded: shaded.map(circle),
    fine: all
      .filter((l) => !isStrong(l))
      .map(circle)
      .join(''),
    strong: all.filter(isStrong).map(circle).join(''),
  };
}

function nameContours({ toPixel, pixelsPerUnit }: NyquistView, board: LabelBoard): void {
  for (const level of legibleContours(contourLevels.strong, pixelsPerUnit, LABEL_PITCH)) {
    const places = LABEL_ANGLES.map((degrees) => {
      const { re, im } = contourPoint(level, (degrees * Math.PI) / 180);
      const { x, y } = toPixel(re, im);
      return { x, y: y + 4, anchor: 'middle' as const };
    });
    board.add([formatNumber(level, 1)], 'contour', places);
  }
}

/** A contour as a curve that labels keep off. */
function contourLine(level: number, { toX, toY }: NyquistView): Polyline {
  const points = Array.from({ length: CONTOUR_POINTS + 1 }, (_, i) => contourPoint(level, (2 * Math.PI * i) / CONTOUR_POINTS));
  return toPolyline(
    points.map(({ re }) => re),
    points.map(({ im }) => im),
    toX,
    toY,
  );
}

const TICK = 3;

function axes({ toX, toY, real, imaginary, pixelsPerUnit }: NyquistView, plot: Rect): string {
  const step = pixelsPerUnit >= 60 ? 0.5 : pixelsPerUnit >= 24 ? 1 : 5;
  const x0 = clamp(toX(0), plot.x, plot.x + plot.width);
  const y0 = clamp(toY(0), plot.y, plot.y + plot.height);
  const across = multiples(step, real)
    .filter((v) => v !== 0 && v !== -1)
    .map((v) => `M${round2(toX(v))} ${y0 - TICK}v${2 * TICK}`);
  const up = multiples(step, imaginary)
    .filter((v) => v !== 0)
    .map((v) => `M${x0 - TICK} ${round2(toY(v))}h${2 * TICK}`);
  return [`M${plot.x} ${y0}h${plot.width}M${x0} ${plot.y}v${plot.height}`, ...across, ...up].join('');
}

function axisLabels({ toX, toY }: NyquistView, plot: Rect): AxisLabel[] {
  return [
    { x: plot.x + plot.width, y: toY(0) - 6, text: 'Re', anchor: 'end' },
    { x: toX(0) + 7, y: plot.y + plot.height - 6, text: 'Im', anchor: 'start' },
  ];
}

const lines = remember<readonly number[], Polyline>();

/** L in the plane, |S| drawn as height round −1: contours, the Ms limit as a kerb, posts and arrowheads along L, the nearest point with its number. */
export function nyquistPicture(scene: LoopScene, window: NyquistWindow, plot: Rect): PlanePicture {
  const view = nyquistView(window, plot);
  const summit = view.toPixel(-1, 0);
  const placement = [...view.real, ...view.imaginary, plot.x, plot.y, plot.width, plot.height];
  const draw = ({ loop }: ReturnType<typeof responseOf>): Polyline =>
    lines(loop.real, placement, () => toPolyline(loop.real, loop.imaginary, view.toX, view.toY));
  const response = responseOf(scene.a);
  const lineA = draw(response);
  const lineB = scene.b === undefined ? null : draw(responseOf(scene.b));
  const limit = scene.limits?.ms;
  const others = (scene.others ?? []).map(draw);
  const board = createLabelBoard({
    bounds: plot,
    curves: [lineA, ...(lineB === null ? [] : [lineB]), ...(limit === undefined ? [] : [contourLine(limit, view)])],
    faint: others,
    shaded: [boxAround(summit.x, summit.y, contourRadius(1.2) * view.pixelsPerUnit)],
  });
  const toPixel = ({ re, im }: { re: number; im: number }) => view.toPixel(re, im);
  board.reserve(boxAround(summit.x, summit.y, 8));
  board.add(['\u22121'], 'strong', [
    { x: summit.x, y: summit.y + 20, anchor: 'middle' },
    { x: summit.x, y: summit.y - 12, anchor: 'middle' },
  ]);
  const ground = { toPixel, plot, board };
  const worst = worstMark(scene, () => summit, ground);
  const posts = postMarks(scene, lineA, ground);
  nameContours(view, board);
  return {
    plot,
    contours: contourPaths(summit, view.pixelsPerUnit, limit),
    grid: '',
    axes: axes(view, plot),
    axisLabels: axisLabels(view, plot),
    unitCircle: circlePath(view.toPixel(0, 0), view.pixelsPerUnit),
    kerbs: limit === undefined ? [] : [{ center: summit, circle: circleKerb(contourRadius(limit) * view.pixelsPerUnit) }],
    summits: [summit],
    curves: {
      a: polylinePath(lineA, plot),
      b: lineB === null ? '' : polylinePath(lineB, plot),
      others: others.map((line) => polylinePath(line, plot)).join(''),
    },
    arrows: arrowheads(lineA, plot),
    posts,
    labels: board.labels,
    worst,
    lineA,
    toPixel,
  };
}
