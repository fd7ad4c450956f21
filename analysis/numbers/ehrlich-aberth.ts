import { magnitude, type Complex } from './complex';

const MAX_ROUNDS = 200;
/** A root moves no more where its correction falls below this multiple of its magnitude. */
const STILL = 2 ** -52;
/** A correction at a point where rounding already hides f is taken only if it is smaller than this: beyond, it is noise. */
const POLISH = 1e-6;
/** Nudge, relative to a root's magnitude, off a point where the step is not finite. */
const NUDGE = 1e-12;

/**
 * What the iteration asks of a function f: its Newton step at a point, in `step[0..1]` = f/f'.
 * True where f is so small there that rounding alone could have made it: the root is then final.
 */
export type NewtonStep = (re: number, im: number, step: Float64Array) => boolean;

/**
 * All zeros of an analytic function with as many zeros as starting points, found together:
 * Newton's step with the other approximations deflated implicitly. Cubic at simple roots, linear at multiple ones.
 *
 * @see REFERENCES Aberth 1973, equation (4)
 */
export const ehrlichAberth = (start: readonly Complex[], newtonStep: NewtonStep): Complex[] => {
  const re = Float64Array.from(start, (z) => z.re);
  const im = Float64Array.from(start, (z) => z.im);
  const final = new Uint8Array(start.length);
  const step = new Float64Array(2);
  for (let round = 0; round < MAX_ROUNDS && final.includes(0); round += 1) {
    for (let i = 0; i < re.length; i += 1) {
      if (final[i] === 1) continue;
      const done = newtonStep(re[i], im[i], step);
      deflate(re, im, i, step);
      const size = magnitude(re[i], im[i]);
      const length = magnitude(step[0], step[1]);
      if (!Number.isFinite(length)) re[i] += NUDGE * (size + Number.MIN_VALUE);
      else if (!done || length <= POLISH * size) {
        re[i] -= step[0];
        im[i] -= step[1];
      }
      if (done || length <= STILL * size) final[i] = 1;
    }
  }
  return Array.from(re, (x, i) => ({ re: x, im: im[i] }));
};

/** Turns a Newton step N into Ehrlich's: N/(1 − N·Σⱼ 1/(zᵢ − zⱼ)). */
const deflate = (re: Float64Array, im: Float64Array, i: number, step: Float64Array): void => {
  let sumRe = 0;
  let sumIm = 0;
  for (let j = 0; j < re.length; j += 1) {
    if (j === i) continue;
    const x = re[i] - re[j];
    const y = im[i] - im[j];
    const square = x * x + y * y;
    if (square === 0) continue;
    sumRe += x / square;
    sumIm -= y / square;
  }
  const denominatorRe = 1 - (step[0] * sumRe - step[1] * sumIm);
  const denominatorIm = -(step[0] * sumIm + step[1] * sumRe);
  const square = denominatorRe * denominatorRe + denominatorIm * denominatorIm;
  const [x, y] = step;
  step[0] = (x * denominatorRe + y * denominatorIm) / square;
  step[1] = (y * denominatorRe - x * denominatorIm) / square;
};
