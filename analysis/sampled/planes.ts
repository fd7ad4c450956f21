import type { Rational } from '@/analysis/loop/model';
import type { Complex } from '@/analysis/numbers/complex';

/**
 * A function of z stands in two planes here, each with its use:
 *
 * w = z − 1, in which modes that are slow beside the sample period keep their digits: held plants and closed-loop poles;
 * v = (z − 1)/(z + 1), in which the unit circle z = e^(jωh) is the imaginary axis, v = j·tan(ωh/2), and z = −1 its end:
 * all that reads a loop over frequency works there as it does for a continuous loop.
 *
 * @see REFERENCES Tustin 1947
 */

/** Nearer to z = −1 than this a root is taken to be there: rounding of roots found in double precision. */
const AT_MINUS_ONE = 1e-12;
/** Past this exponent e^x is all there is of sinh and cosh, or nothing. */
const LARGE = 20;

/** e^(s·h) − 1 for a root s of the s plane, without cancellation. */
export const shiftedRoot = ({ re, im }: Complex, period: number): Complex => {
  const [growth, angle] = [re * period, im * period];
  const half = Math.sin(angle / 2);
  return { re: Math.expm1(growth) * Math.cos(angle) - 2 * half * half, im: Math.exp(growth) * Math.sin(angle) };
};

/** tanh(s·h/2): undamped stays undamped. */
export const bilinearRoot = ({ re, im }: Complex, period: number): Complex => {
  const [growth, angle] = [re * period, im * period];
  if (Math.abs(growth) > LARGE) return toV(shiftedRoot({ re, im }, period));
  const below = Math.cosh(growth) + Math.cos(angle);
  return { re: Math.sinh(growth) / below, im: Math.sin(angle) / below };
};

/** w/(w + 2). */
const toV = ({ re, im }: Complex): Complex => {
  const square = (2 + re) * (2 + re) + im * im;
  return { re: (re * (2 + re) + im * im) / square, im: (2 * im) / square };
};

/** 2v/(1 − v). */
const toW = ({ re, im }: Complex): Complex => {
  const square = (1 - re) * (1 - re) + im * im;
  return { re: (2 * (re * (1 - re) - im * im)) / square, im: (2 * im) / square };
};

/** Applies a map to each real root and to the upper one of each pair; the lower one follows. */
export const mapRoots = (roots: readonly Complex[], map: (root: Complex) => Complex): Complex[] =>
  roots.flatMap((root) => {
    if (root.im < 0) return [];
    const { re, im } = map(root);
    if (root.im === 0) return [{ re, im: 0 }];
    return [
      { re, im: Math.abs(im) },
      { re, im: -Math.abs(im) },
    ];
  });

/** Π(2 + w) over roots in the w plane. */
const plusTwo = (roots: readonly Complex[]): number =>
  roots.reduce((product, { re, im }) => (im < 0 ? product : product * (im === 0 ? 2 + re : (2 + re) ** 2 + im * im)), 1);

/** Π(1 − v) over roots in the v plane. */
const oneMinus = (roots: readonly Complex[]): number =>
  roots.reduce((product, { re, im }) => (im < 0 ? product : product * (im === 0 ? 1 - re : (1 - re) ** 2 + im * im)), 1);

const repeated = (re: number, count: number): Complex[] => Array.from({ length: Math.max(count, 0) }, () => ({ re, im: 0 }));

/**
 * The same function of v for one of w: w − a = (2 + a)·(v − a/(2 + a))/(1 − v). A root at z = −1 goes to infinity.
 * `polesInV` where the poles are known better than from their places in w.
 */
export const inV = ({ gain, zeros, poles }: Rational, polesInV?: readonly Complex[]): Rational => {
  const isFar = ({ re, im }: Complex) => Math.hypot(2 + re, im) <= AT_MINUS_ONE;
  const [near, far] = [zeros.filter((root) => !isFar(root)), zeros.filter(isFar)];
  const excess = poles.length - zeros.length;
  return {
    gain: (gain * plusTwo(near) * 2 ** far.length * (excess % 2 === 0 ? 1 : -1)) / plusTwo(poles),
    zeros: [...mapRoots(near, toV), ...repeated(1, excess)],
    poles: [...(polesInV ?? mapRoots(poles, toV)), ...repeated(1, -excess)],
  };
};

/** The same function of w for one of v: v − a = (1 − a)·(w − 2a/(1 − a))/(w + 2). A root at v = 1 is z = ∞. */
export const inW = ({ gain, zeros, poles }: Rational): Rational => {
  const isEndless = ({ re, im }: Complex) => re === 1 && im === 0;
  const excess = poles.length - zeros.length;
  const scaleOf = (roots: readonly Complex[]) =>
    oneMinus(roots.filter((root) => !isEndless(root))) * (-2) ** roots.filter(isEndless).length;
  const mapped = (roots: readonly Complex[]) =>
    mapRoots(
      roots.filter((root) => !isEndless(root)),
      toW,
    );
  return {
    gain: (gain * scaleOf(zeros)) / scaleOf(poles),
    zeros: [...mapped(zeros), ...repeated(-2, excess)],
    poles: [...mapped(poles), ...repeated(-2, -excess)],
  };
};
