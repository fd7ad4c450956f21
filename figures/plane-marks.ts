import { bisectRight } from 'd3-array';
import { type CurveMark, legiblePosts, type Post, postPath } from './curve-marks';
import { formatFactor, formatFrequency, shortNumber, withUnit } from './format';
import { contains, type Point, type Rect } from './geometry';
import { boxAround, type LabelBoard } from './label-board';
import { type LoopPoint, type LoopScene, responseOf } from './loop-picture';
import type { WorstMark } from './plane-picture';
import { type LabelPlace, type PlacedLabel, placesAround } from './place-label';
import { pointAt, type Polyline } from './polyline';
import { frequencyFrom, frequencyIn, type FrequencyUnit } from './units';

type ToPixel = (point: LoopPoint) => Point;

/** The picture that marks are put on. */
export interface MarkGround {
  readonly toPixel: ToPixel;
  readonly plot: Rect;
  readonly board: LabelBoard;
}

const POST_DIGITS = [1, 2, 5];

/** 1, 2, 5 × 10ⁿ of the reader's unit within a range of rad/s. */
function postFrequencies(frequencies: readonly number[], unit: FrequencyUnit): { frequency: number; text: string }[] {
  if (frequencies.length < 2) return [];
  const low = frequencyIn(unit, frequencies[0]);
  const high = frequencyIn(unit, frequencies[frequencies.length - 1]);
  const first = Math.floor(Math.log10(low));
  const exponents = Array.from({ length: Math.max(0, Math.floor(Math.log10(high)) - first + 1) }, (_, i) => first + i);
  return exponents
    .flatMap((exponent) => POST_DIGITS.map((digit) => Number(`${digit}e${exponent}`)))
    .filter((value) => value >= low && value <= high)
    .map((value) => ({ frequency: frequencyFrom(unit, value), text: shortNumber(value, 1) }));
}

/** A place on a curve by its frequency, interpolated: good to a fraction of a pixel on the engine's grid. */
function postAt(frequencies: readonly number[], line: Polyline, frequency: number): CurveMark {
  const i = Math.min(Math.max(bisectRight(frequencies, frequency), 1), frequencies.length - 1);
  const t = Math.log(frequency / frequencies[i - 1]) / Math.log(frequencies[i] / frequencies[i - 1]);
  const [from, to] = [pointAt(line, i - 1), pointAt(line, i)];
  const point = { x: from.x + (to.x - from.x) * t, y: from.y + (to.y - from.y) * t };
  return { point, angle: (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI };
}

function placesAcross({ point, angle }: CurveMark): LabelPlace[] {
  return [-90, 90, -60, 60, -120, 120].flatMap((turn) => {
    const a = ((angle + turn) * Math.PI) / 180;
    const dx = Math.cos(a);
    const anchor: LabelPlace['anchor'] = dx > 0.3 ? 'start' : dx < -0.3 ? 'end' : 'middle';
    return [11, 16, 24].map((d) => ({ x: point.x + d * dx, y: point.y + d * Math.sin(a) + 4.5, anchor }));
  });
}

/** Posts at round frequencies along A, their names put on the board; SVG path data of the bars. */
export function postMarks({ a, units }: LoopScene, line: Polyline, { plot, board }: MarkGround): string {
  const { frequencies } = responseOf(a);
  const all: Post[] = postFrequencies(frequencies, units.frequency).map(({ frequency, text }) => ({
    ...postAt(frequencies, line, frequency),
    text,
  }));
  const posts = legiblePosts(all, plot);
  for (const post of posts) board.add([post.text], 'quiet', placesAcross(post));
  return posts.map((post) => postPath(post)).join('');
}

const LABEL_DISTANCES = [16, 26, 40, 60, 80, 105];

function leaderTo(point: Point, place: PlacedLabel): WorstMark['leader'] {
  const { x, y, width, height } = place.box;
  const end = { x: Math.max(x, Math.min(x + width, point.x)), y: Math.max(y + 3, Math.min(y + height - 3, point.y)) };
  const distance = Math.hypot(end.x - point.x, end.y - point.y);
  if (distance < 22) return null;
  return [{ x: point.x + ((end.x - point.x) * 7) / distance, y: point.y + ((end.y - point.y) * 7) / distance }, end];
}

/** The point of A nearest to −1 with Ms and its frequency; null where that lies at no finite frequency or outside the picture. */
export function worstMark(
  scene: LoopScene,
  summitNear: (point: LoopPoint) => Point,
  { toPixel, plot, board }: MarkGround,
): WorstMark | null {
  const { value, frequency } = scene.a.analysis.sensitivity.ms;
  if (frequency === null || frequency <= 0) return null;
  const at = scene.a.at(frequency);
  const point = toPixel(at);
  if (!contains(plot, point)) return null;
  board.reserve(boxAround(point.x, point.y, 7));
  const stable = scene.a.analysis.closedLoop.stable;
  const where = withUnit(formatFrequency(frequency, scene.units.frequency), scene.units.frequency);
  const lines = [`Ms ${formatFactor(value)}`, stable ? where : 'no meaning while unstable'];
  const place = board.add(lines, stable ? 'strong' : 'struck', placesAround(point, LABEL_DISTANCES));
  return { point, summit: summitNear(at), leader: leaderTo(point, place) };
}
