import { type CurveMark, legiblePosts, type Post, postPath } from './curve-marks';
import { formatFactor, formatFrequency, shortNumber, withUnit } from './format';
import { contains, type Point, type Rect } from './geometry';
import { boxAround, type LabelBoard } from './label-board';
import type { ChartDesign, LoopPoint, LoopScene } from './loop-picture';
import type { WorstMark } from './plane-picture';
import { type LabelPlace, type PlacedLabel, placesAround } from './place-label';
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

const STEP = 1.005;

function postAt(design: ChartDesign, frequency: number, toPixel: ToPixel): CurveMark {
  const point = toPixel(design.at(frequency));
  const next = toPixel(design.at(frequency * STEP));
  return { point, angle: (Math.atan2(next.y - point.y, next.x - point.x) * 180) / Math.PI };
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
export function postMarks(scene: LoopScene, frequencies: readonly number[], { toPixel, plot, board }: MarkGround): string {
  const all: Post[] = postFrequencies(frequencies, scene.units.frequency).map(({ frequency, text }) => ({
    ...postAt(scene.a, frequency, toPixel),
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
