import { formatFrequency, formatMagnitude, shortNumber, withUnit } from './format';
import type { FrequencyAxis } from './frequency-axis';
import { derivedOrdinate, frequencyCurves, ordinatesWithin } from './frequency-curves';
import { contains, type Rect } from './geometry';
import { straightKerb } from './kerb';
import { boxAround, createLabelBoard, type LabelBoard, placesBeside } from './label-board';
import type { Axis } from './linear-axis';
import { magnitudeAxis } from './loop-axes';
import { responseOf, type LoopScene } from './loop-picture';
import { crossoverOf, gainMarginBar } from './margin-marks';
import type { PanelPicture } from './panel';
import { placesAround } from './place-label';
import { magnitudeIn, toDecibels } from './units';

/** Half the length of the short kerb across a margin bar. */
export const SHORT_KERB = 17;

const decibels = derivedOrdinate(({ loop }) => loop.magnitude.map(toDecibels));

type Marks = Pick<PanelPicture, 'kerbs' | 'bars' | 'dots'>;

function marginMarks(scene: LoopScene, across: FrequencyAxis, up: Axis, board: LabelBoard): Marks {
  const bar = gainMarginBar(scene.a.analysis);
  if (bar === null || bar.frequency < across.domain[0] || bar.frequency > across.domain[1]) return { kerbs: [], bars: [], dots: [] };
  const [x, from, to] = [across.at(bar.frequency), up.at(bar.from), up.at(bar.to)];
  const limit = scene.limits?.gainMargin;
  const y = limit === undefined ? null : up.at(-toDecibels(limit));
  board.reserve(boxAround(x, (from + to) / 2, 3));
  if (y !== null) board.reserve({ x: x - SHORT_KERB, y: y - 8, width: 2 * SHORT_KERB, height: 10 });
  const unit = scene.units.magnitude === 'dB' ? 'dB' : '';
  const stable = scene.a.analysis.closedLoop.stable;
  const number = withUnit(formatMagnitude(bar.factor, scene.units.magnitude), unit);
  board.add(
    [unit === '' ? `× ${number}` : number],
    stable ? 'strong' : 'struck',
    placesBeside(x, [to + 17, to + 6, (from + to) / 2 + 4, from - 6, to - 8]),
  );
  if (y === null || limit === undefined) return { kerbs: [], bars: [{ x, from, to, disc: true }], dots: [] };
  board.add([withUnit(shortNumber(magnitudeIn(scene.units.magnitude, limit), 2), unit)], 'limit', [
    { x: x + SHORT_KERB + 5, y: y + 1, anchor: 'start' },
    { x: x - SHORT_KERB - 5, y: y + 1, anchor: 'end' },
  ]);
  const kerb = straightKerb({ from: { x: x - SHORT_KERB, y }, to: { x: x + SHORT_KERB, y }, thickness: 6, block: 8, side: 'left' });
  return { kerbs: [kerb], bars: [{ x, from, to, disc: true }], dots: [] };
}

function crossoverDots(scene: LoopScene, across: FrequencyAxis, up: Axis, plot: Rect) {
  return scene.a.analysis.margins.gainCrossovers
    .map(({ frequency }) => ({ x: across.at(frequency), y: up.at(0), radius: 3 }))
    .filter((dot) => contains(plot, dot));
}

/** |L| over frequency: the gain crossovers on 0 dB, the gain margin as a bar at its phase crossover. */
export function magnitudePanel(scene: LoopScene, across: FrequencyAxis, plot: Rect): PanelPicture {
  const values = [scene.a, scene.b].flatMap((design) =>
    design === undefined ? [] : ordinatesWithin(responseOf(design), across, decibels),
  );
  const up = magnitudeAxis(values, [plot.y + plot.height, plot.y], scene.units.magnitude);
  const { a, b, paths } = frequencyCurves(scene, decibels, { across, up, plot });
  const board = createLabelBoard({ bounds: plot, curves: b === null ? [a] : [a, b] });
  const marks = marginMarks(scene, across, up, board);
  const dots = crossoverDots(scene, across, up, plot);
  const crossover = crossoverOf(scene.a.analysis);
  if (crossover !== null && crossover >= across.domain[0] && crossover <= across.domain[1]) {
    const text = withUnit(formatFrequency(crossover, scene.units.frequency), scene.units.frequency);
    board.add([text], 'quiet', placesAround({ x: across.at(crossover), y: up.at(0) }, [12, 20, 30]));
  }
  const unit = scene.units.magnitude;
  return {
    title: '|L|',
    unit,
    plot,
    axis: up,
    strong: [0],
    curves: { ...paths, secondA: '', secondB: '' },
    ...marks,
    dots,
    labels: board.labels,
  };
}
