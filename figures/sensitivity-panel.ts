import { formatFactor } from './format';
import type { FrequencyAxis } from './frequency-axis';
import { frequencyCurves, type Ordinate } from './frequency-curves';
import { clamp, type Rect } from './geometry';
import { straightKerb } from './kerb';
import { boxAround, createLabelBoard, type LabelBoard } from './label-board';
import type { Axis } from './linear-axis';
import type { LoopScene } from './loop-picture';
import type { PanelPicture } from './panel';
import { placesAround, type LabelPlace } from './place-label';
import type { Polyline } from './polyline';
import { axisWithStep } from './value-axis';

const sensitivity: Ordinate = (response) => response.sensitivity;
const complementary: Ordinate = (response) => response.complementarySensitivity;

const LEAST_TOP = 2;
const MOST_TOP = 6;

function axisFor(scene: LoopScene, plot: Rect): Axis {
  const peaks = [scene.a, scene.b].flatMap((d) =>
    d === undefined ? [] : [d.analysis.sensitivity.ms.value, d.analysis.sensitivity.mt.value],
  );
  const needed = Math.max(Math.max(...peaks) * 1.08, (scene.limits?.ms ?? 0) + 0.2);
  const top = clamp(Math.ceil(needed * 2) / 2, LEAST_TOP, MOST_TOP);
  const step = top <= 2.5 && plot.height >= 90 ? 0.5 : top <= 4 ? 1 : 2;
  return axisWithStep([0, top], step, [plot.y + plot.height, plot.y]);
}

function peakMarks(scene: LoopScene, across: FrequencyAxis, up: Axis, board: LabelBoard): PanelPicture['dots'] {
  const { ms, mt } = scene.a.analysis.sensitivity;
  const stable = scene.a.analysis.closedLoop.stable;
  const mark = (peak: { value: number; frequency: number | null }, radius: number) => {
    const frequency = clamp(peak.frequency ?? Infinity, ...across.domain);
    return { x: across.at(frequency), y: up.at(Math.min(peak.value, up.domain[1])), radius };
  };
  const dots = [mark(ms, 4.5), mark(mt, 3)];
  dots.forEach(({ x, y }) => board.reserve(boxAround(x, y, 5)));
  board.add([`Ms ${formatFactor(ms.value)}`], stable ? 'strong' : 'struck', placesAround(dots[0], [12, 18, 26, 36]));
  board.add([`Mt ${formatFactor(mt.value)}`], stable ? 'quiet' : 'struck', placesAround(dots[1], [10, 16, 24, 34]));
  return dots;
}

/** Places above and below a curve along the picture, for its name. */
function placesAlong({ x, y }: Polyline, plot: Rect): LabelPlace[] {
  const steps = [0.06, 0.14, 0.22, 0.34, 0.5, 0.66, 0.8, 0.92];
  const places = steps.map((step) => {
    const i = x.findIndex((value) => value >= plot.x + step * plot.width);
    return i < 0 ? null : { x: x[i], y: y[i] };
  });
  return places.flatMap((p) =>
    p === null
      ? []
      : [
          { x: p.x, y: p.y - 8, anchor: 'middle' as const },
          { x: p.x, y: p.y + 18, anchor: 'middle' as const },
        ],
  );
}

/** |S| and |T| over frequency, factors: S thick, T thin, the Ms limit as a kerb along its ceiling. */
export function sensitivityPanel(scene: LoopScene, across: FrequencyAxis, plot: Rect): PanelPicture {
  const up = axisFor(scene, plot);
  const frame = { across, up, plot };
  const s = frequencyCurves(scene, sensitivity, frame);
  const t = frequencyCurves({ ...scene, others: undefined }, complementary, frame);
  const board = createLabelBoard({ bounds: plot, curves: [s.a, t.a, s.b, t.b].filter((curve) => curve !== null) });
  const limit = scene.limits?.ms;
  const right = plot.x + plot.width;
  const kerbs: PanelPicture['kerbs'] =
    limit === undefined ? [] : [straightKerb({ from: { x: plot.x, y: up.at(limit) }, to: { x: right, y: up.at(limit) }, side: 'left' })];
  if (limit !== undefined) {
    const y = up.at(limit);
    board.reserve({ x: plot.x, y: y - 8, width: plot.width, height: 10 });
    board.add([`|S| at most ${formatFactor(limit)}`], 'limit', [
      { x: plot.x + 4, y: y - 10, anchor: 'start' },
      { x: right - 4, y: y - 10, anchor: 'end' },
      { x: right - 4, y: y + 16, anchor: 'end' },
    ]);
  }
  const dots = peakMarks(scene, across, up, board);
  board.add(['|S|'], 'strong', placesAlong(s.a, plot));
  board.add(['|T|'], 'quiet', placesAlong(t.a, plot));
  const curves = { ...s.paths, secondA: t.paths.a, secondB: t.paths.b };
  return { title: '|S| and |T|', unit: 'factor', plot, axis: up, strong: [1], curves, kerbs, bars: [], dots, labels: board.labels };
}
