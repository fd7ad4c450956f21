import { magnitude, type Complex } from './complex';
import { pairConjugates } from './conjugates';
import { ehrlichAberth, type NewtonStep } from './ehrlich-aberth';
import { hornerRoom, hornerWithSlope } from './horner';
import { collapseClusters } from './multiple-roots';
import { startingPoints } from './newton-polygon';
import { withoutLeadingZeros } from './polynomial';

/** A value below this many roundings of the sum of magnitudes may be nothing but rounding. */
const ROUNDINGS = 4 * 2 ** -53;

/**
 * All roots of a real polynomial, conjugates exactly paired, roots at the origin and multiple roots exact where the
 * coefficients allow it. The variable is scaled to the roots' geometric mean first, so that no power overflows.
 *
 * @param descending coefficients, highest power first; not all zero
 * @see REFERENCES Aberth 1973, Bini 1996
 * @example polynomialRoots([0.35, 1, 0]) // [{ re: 0, im: 0 }, { re: -2.857142857142857, im: 0 }]
 */
export const polynomialRoots = (descending: readonly number[]): Complex[] => {
  const ascending = [...withoutLeadingZeros(descending)].reverse();
  const atOrigin = ascending.findIndex((c) => c !== 0);
  const origin = Array.from({ length: Math.max(atOrigin, 0) }, () => ({ re: 0, im: 0 }));
  const rest = ascending.slice(atOrigin);
  if (rest.length < 2) return origin;
  if (rest.length === 2) return [...origin, { re: -rest[0] / rest[1], im: 0 }];
  if (rest.length === 3) return [...origin, ...quadraticRoots(rest[2], rest[1], rest[0])];
  const { scaled, scale } = scaleVariable(rest);
  const step = hornerStep(scaled);
  const roots = collapseClusters(pairConjugates(ehrlichAberth(startingPoints(scaled), step)), scaled);
  return [...origin, ...roots.map(({ re, im }) => ({ re: re * scale, im: im * scale }))];
};

/** Roots of a·s² + b·s + c without cancellation; a and c are not zero. */
export const quadraticRoots = (a: number, b: number, c: number): Complex[] => {
  const half = 0 - b / (2 * a);
  const product = c / a;
  const square = half * half - product;
  if (square < 0) return [1, -1].map((sign) => ({ re: half, im: sign * Math.sqrt(-square) }));
  const far = half + (half < 0 ? -1 : 1) * Math.sqrt(square);
  return [product / far, far].map((re) => ({ re, im: 0 })).sort((x, y) => Math.abs(x.re) - Math.abs(y.re));
};

/** The polynomial in z = s/scale, with its largest coefficient 1 and its end coefficients equal in magnitude. */
const scaleVariable = (ascending: readonly number[]) => {
  const degree = ascending.length - 1;
  const logScale = (Math.log(Math.abs(ascending[0])) - Math.log(Math.abs(ascending[degree]))) / degree;
  const logs = ascending.map((c, k) => Math.log(Math.abs(c)) + k * logScale);
  const shift = Math.max(...logs);
  const scale = Math.exp(logScale);
  return { scaled: ascending.map((c, k) => (c === 0 ? 0 : Math.sign(c) * Math.exp(logs[k] - shift))), scale };
};

/** Newton's step p/p′ by Horner's rule, in 1/z outside the unit circle so that powers stay small. */
const hornerStep = (ascending: readonly number[]): NewtonStep => {
  const degree = ascending.length - 1;
  const room = hornerRoom();
  const inward = newtonStep([...ascending].reverse(), room);
  const outward = newtonStep(ascending, room);
  return (re, im, step) => {
    const square = re * re + im * im;
    if (square <= 1) return inward(re, im, step);
    const x = re / square;
    const y = -im / square;
    const done = outward(x, y, step);
    // p(z) = zⁿ·q(w), w = 1/z: p/p′ = z/(n − w·q′/q), with q/q′ in `step`.
    const length = step[0] * step[0] + step[1] * step[1];
    const ratioRe = degree - (x * step[0] + y * step[1]) / length;
    const ratioIm = -(y * step[0] - x * step[1]) / length;
    const ratioSquare = ratioRe * ratioRe + ratioIm * ratioIm;
    if (length === 0) step.fill(0);
    else {
      step[0] = (re * ratioRe + im * ratioIm) / ratioSquare;
      step[1] = (im * ratioRe - re * ratioIm) / ratioSquare;
    }
    return done;
  };
};

/** p/p′ into `step`; true where |p| is within rounding of 0. Leading coefficient first. */
const newtonStep =
  (descending: readonly number[], room: Float64Array): NewtonStep =>
  (re, im, step) => {
    hornerWithSlope(descending, re, im, room);
    const [valueRe, valueIm, slopeRe, slopeIm, sum] = room;
    const square = slopeRe * slopeRe + slopeIm * slopeIm;
    step[0] = (valueRe * slopeRe + valueIm * slopeIm) / square;
    step[1] = (valueIm * slopeRe - valueRe * slopeIm) / square;
    return magnitude(valueRe, valueIm) <= ROUNDINGS * sum;
  };
