import { extent } from 'd3-array';
import { arrowheads } from './curve-marks';
import { formatNumber, withUnit } from './format';
import { type Point, type Rect, round2 } from './geometry';
import { closedKerb } from './kerb';
import { boxAround, createLabelBoard, type LabelBoard } from './label-board';
import { linearScale, multiples } from './linear-axis';
import { nearestOddHalfTurn, oddHalfTurns } from './loop-axes';
import { type LoopScene, responseOf } from './loop-picture';
import type { NicholsWindow } from './nichols-window';
import { postMarks, worstMark } from './plane-marks';
import type { AxisLabel, ContourPaths, PlanePicture } from './plane-picture';
import { type Polyline, polylinePath, toPolyline } from './polyline';
import { contourLevels, contourPoint, nicholsContour, toNichols } from './sensitivity-contours';
import { toDecibels } from './units';

const DRAWN = [1.2, 1.4, 2, 3, 6];
const NAMED = [1.2, 1.4];
const NAME_ANGLES = [62, 40, 90, 120, 150, 300, 270, 240];
const DECIBEL_STEP = 10;

type ToPlane = (phaseDegrees: number, decibels: number) => Point;

const closed = (points: readonly Point[]): string => `M${points.map((p) => `${round2(p.x)} ${round2(p.y)}`).join('L')}Z`;

function contourPaths(turns: readonly number[], toPlane: ToPlane, limit: number | undefined): ContourPaths {
  const outline = (level: number) => turns.map((turn) => closed(nicholsContour(level, turn, toPlane))).join('');
  const isStrong = (level: number) => contourLevels.strong.some((strong) => strong === level);
  const shaded = contourLevels.shaded.map((level) => (level === 1.7 ? (limit ?? level) : level));
  return {
    shaded: shaded.map(outline),
    fine: DRAWN.filter((level) => !isStrong(level))
      .map(outline)
      .join(''),
    strong: DRAWN.filter(isStrong).map(outline).join(''),
  };
}

function nameContours(turn: number, toPlane: ToPlane, board: LabelBoard): void {
  for (const level of NAMED) {
    const places = NAME_ANGLES.map((degrees) => {
      const { phaseDegrees, decibels } = toNichols(contourPoint(level, (degrees * Math.PI) / 180));
      const { x, y } = toPlane(phaseDegrees + turn, decibels);
      return { x, y: y + 4, anchor: 'middle' as const };
    });
    board.add([formatNumber(level, 1)], 'contour', places);
  }
}

/** A closed outline as a curve that labels keep off. */
const closedLine = (points: readonly Point[]): Polyline => ({
  x: [...points, points[0]].map(({ x }) => x),
  y: [...points, points[0]].map(({ y }) => y),
});

function boxOf(points: readonly Point[]): Rect {
  const [left, right] = extent(points, ({ x }) => x).map(Number);
  const [top, bottom] = extent(points, ({ y }) => y).map(Number);
  return { x: left, y: top, width: right - left, height: bottom - top };
}

interface Grid {
  grid: string;
  axes: string;
  axisLabels: AxisLabel[];
}

function gridOf({ phaseDegrees, decibels }: NicholsWindow, toPlane: ToPlane, plot: Rect): Grid {
  const pixelsPerDegree = plot.width / (phaseDegrees[1] - phaseDegrees[0]);
  const step = 90 * pixelsPerDegree >= 50 ? 90 : 180;
  const rows = multiples(DECIBEL_STEP, decibels).map((value) => ({ value, y: round2(toPlane(0, value).y) }));
  const columns = multiples(step, phaseDegrees).map((value) => ({ value, x: round2(toPlane(value, 0).x) }));
  const isReference = (degrees: number) => nearestOddHalfTurn(degrees) === degrees;
  const row = (y: number) => `M${plot.x} ${y}h${plot.width}`;
  const column = (x: number) => `M${x} ${plot.y}v${plot.height}`;
  const right = plot.x + plot.width;
  return {
    grid: [
      ...rows.filter((r) => r.value !== 0).map((r) => row(r.y)),
      ...columns.filter((c) => !isReference(c.value)).map((c) => column(c.x)),
    ].join(''),
    axes: [
      ...rows.filter((r) => r.value === 0).map((r) => row(r.y)),
      ...columns.filter((c) => isReference(c.value)).map((c) => column(c.x)),
    ].join(''),
    axisLabels: [
      ...rows.map(({ value, y }) => ({ x: plot.x - 7, y: y + 4.5, text: formatNumber(value, 0), anchor: 'end' as const })),
      ...columns.map(({ value, x }) => ({
        x: Math.min(x, right),
        y: plot.y + plot.height + 18,
        text: withUnit(formatNumber(value, 0), '°'),
        anchor: x > right - 16 ? ('end' as const) : ('middle' as const),
      })),
    ],
  };
}

/** L as phase and decibels. −1, its contours and the Ms kerb stand at every odd half turn of the axis. */
export function nicholsPicture(scene: LoopScene, window: NicholsWindow, plot: Rect): PlanePicture {
  const toX = linearScale(window.phaseDegrees, [plot.x, plot.x + plot.width]);
  const toY = linearScale(window.decibels, [plot.y + plot.height, plot.y]);
  const toPlane: ToPlane = (phaseDegrees, decibels) => ({ x: toX(phaseDegrees), y: toY(decibels) });
  const toPixel = ({ phaseDegrees, magnitude }: { phaseDegrees: number; magnitude: number }) =>
    toPlane(phaseDegrees, toDecibels(magnitude));
  const summitNear = ({ phaseDegrees }: { phaseDegrees: number }) => toPlane(nearestOddHalfTurn(phaseDegrees), 0);
  const draw = ({ loop }: ReturnType<typeof responseOf>): Polyline =>
    toPolyline(loop.phaseDegrees, loop.magnitude.map(toDecibels), toX, toY);
  const response = responseOf(scene.a);
  const lineA = draw(response);
  const lineB = scene.b === undefined ? null : draw(responseOf(scene.b));
  const summits = oddHalfTurns([window.phaseDegrees[0] - 60, window.phaseDegrees[1] + 60]);
  const turns = summits.map((degrees) => degrees + 180);
  const limit = scene.limits?.ms;
  const others = (scene.others ?? []).map(draw);
  const kerbOutlines = limit === undefined ? [] : turns.map((turn) => nicholsContour(limit, turn, toPlane));
  const board = createLabelBoard({
    bounds: plot,
    curves: [lineA, ...(lineB === null ? [] : [lineB]), ...kerbOutlines.map(closedLine)],
    faint: others,
    shaded: turns.map((turn) => boxOf(nicholsContour(1.2, turn, toPlane))),
  });
  for (const degrees of summits) board.reserve(boxAround(toX(degrees), toY(0), 8));
  const ground = { toPixel, plot, board };
  const worst = worstMark(scene, summitNear, ground);
  const posts = postMarks(scene, lineA, ground);
  const mainTurn = turns[turns.length - 1];
  if (mainTurn !== undefined) nameContours(mainTurn, toPlane, board);
  return {
    plot,
    contours: contourPaths(turns, toPlane, limit),
    ...gridOf(window, toPlane, plot),
    unitCircle: '',
    kerbs: kerbOutlines.map((outline) => ({ closed: closedKerb(outline) })),
    summits: summits.map((degrees) => toPlane(degrees, 0)),
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
