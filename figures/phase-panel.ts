import { formatDegrees, formatFrequency, formatNumber, withUnit } from './format';
import type { FrequencyAxis } from './frequency-axis';
import { derivedOrdinate, frequencyCurves, type Ordinate, ordinatesWithin } from './frequency-curves';
import { contains, type Rect } from './geometry';
import { straightKerb, type StraightKerb } from './kerb';
import { createLabelBoard, type LabelBoard, placesBeside } from './label-board';
import { interpolateAt } from './interpolate';
import type { Axis } from './linear-axis';
import { nearestOddHalfTurn, oddHalfTurns, phaseAxis } from './loop-axes';
import { type ChartDesign, responseOf, type LoopScene } from './loop-picture';
import { SHORT_KERB } from './magnitude-panel';
import { phaseMarginBar } from './margin-marks';
import type { PanelPicture } from './panel';
import { placesAround } from './place-label';

const degrees: Ordinate = ({ loop }) => loop.phaseDegrees;
/** What lies under this |L| tells little of the loop: the axis does not follow its phase down. */
const TELLING_MAGNITUDE = 0.2;
const telling = derivedOrdinate(({ loop }) => loop.phaseDegrees.map((phase, i) => (loop.magnitude[i] >= TELLING_MAGNITUDE ? phase : NaN)));

/** arg L at a crossover, read off the curve, which has a point at each; where no curve is, of the loop itself, which takes longer. */
function phaseOf({ analysis: { frequencyResponse }, at }: ChartDesign, frequency: number): number {
  const drawn = frequencyResponse && interpolateAt(frequencyResponse.frequencies, frequencyResponse.loop.phaseDegrees, frequency);
  return drawn ?? at(frequency).phaseDegrees;
}

/** Degrees drawn beside −180° at least, and beyond what is demanded. */
const LEAST_BESIDE = 35;
const ROOM_FOR_KERB = 10;

interface Frame {
  across: FrequencyAxis;
  up: Axis;
  plot: Rect;
  board: LabelBoard;
}

function demandKerbs(demand: number, x: number, reference: number, { up, plot, board }: Frame): StraightKerb[] {
  const sides = [
    { value: reference + demand, side: 'right', baseline: 9 },
    { value: reference - demand, side: 'left', baseline: 2 },
  ] as const;
  return sides.flatMap(({ value, side, baseline }) => {
    const y = up.at(value);
    if (!contains(plot, { x: plot.x, y })) return [];
    board.reserve({ x: x - SHORT_KERB, y: y - 7, width: 2 * SHORT_KERB, height: 14 });
    const text = withUnit(formatNumber(side === 'right' ? demand : -demand, 0), '°');
    board.add([text], 'limit', placesBeside(x, [y + baseline, y + 4], [SHORT_KERB + 5]));
    return [straightKerb({ from: { x: x - SHORT_KERB, y }, to: { x: x + SHORT_KERB, y }, thickness: 6, block: 8, side })];
  });
}

function marginMarks(scene: LoopScene, frame: Frame): Pick<PanelPicture, 'kerbs' | 'bars'> {
  const { across, up, board } = frame;
  const bar = phaseMarginBar(scene.a.analysis, (frequency) => phaseOf(scene.a, frequency));
  if (bar === null || bar.frequency < across.domain[0] || bar.frequency > across.domain[1]) return { kerbs: [], bars: [] };
  const [x, from, to] = [across.at(bar.frequency), up.at(bar.from), up.at(bar.to)];
  board.reserve({ x: x - 2, y: Math.min(from, to), width: 4, height: Math.abs(from - to) });
  const kerbs = scene.limits?.phaseMargin === undefined ? [] : demandKerbs(scene.limits.phaseMargin, x, bar.from, frame);
  const tone = scene.a.analysis.closedLoop.stable ? 'strong' : 'struck';
  board.add(
    [withUnit(formatDegrees(bar.degrees), '°')],
    tone,
    placesBeside(x, [from - 6, (from + to) / 2 + 4, from + 16, to + 14, to - 6]),
  );
  return { kerbs, bars: [{ x, from, to, disc: true }] };
}

function phaseCrossoverMark(scene: LoopScene, { across, up, plot, board }: Frame): PanelPicture['dots'] {
  const frequency = scene.a.analysis.margins.gain?.frequency ?? null;
  if (frequency === null || frequency <= 0) return [];
  const dot = { x: across.at(frequency), y: up.at(nearestOddHalfTurn(phaseOf(scene.a, frequency))), radius: 3 };
  if (!contains(plot, dot)) return [];
  board.add([withUnit(formatFrequency(frequency, scene.units.frequency), scene.units.frequency)], 'quiet', placesAround(dot, [12, 20, 30]));
  return [dot];
}

/** arg L over frequency: every odd half turn is a reference line, the phase margin a bar from it at the crossover. */
export function phasePanel(scene: LoopScene, across: FrequencyAxis, plot: Rect): PanelPicture {
  const values = [scene.a, scene.b].flatMap((design) => (design === undefined ? [] : ordinatesWithin(responseOf(design), across, telling)));
  const up = phaseAxis(values, [plot.y + plot.height, plot.y], (scene.limits?.phaseMargin ?? LEAST_BESIDE) + ROOM_FOR_KERB);
  const { a, b, paths } = frequencyCurves(scene, degrees, { across, up, plot });
  const board = createLabelBoard({ bounds: plot, curves: b === null ? [a] : [a, b] });
  const frame = { across, up, plot, board };
  const marks = marginMarks(scene, frame);
  const dots = phaseCrossoverMark(scene, frame);
  const curves = { ...paths, secondA: '', secondB: '' };
  return { title: 'arg L', unit: 'degrees', plot, axis: up, strong: oddHalfTurns(up.domain), curves, ...marks, dots, labels: board.labels };
}
