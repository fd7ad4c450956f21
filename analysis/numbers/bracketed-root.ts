/** Relative width at which a bracket counts as a point: a few roundings. */
const RELATIVE = 4 * 2 ** -52;
const MAX_EVALUATIONS = 120;

/** Two points with the function's values there, which differ in sign. */
export interface Bracket {
  readonly a: number;
  readonly fa: number;
  readonly b: number;
  readonly fb: number;
}

/**
 * A zero of a continuous function inside a bracket, by Brent's method: inverse quadratic steps while they shrink the
 * bracket, bisection where they do not. Typically 6 to 9 evaluations.
 *
 * @returns the zero, within four roundings
 * @see REFERENCES Brent 1973, chapter 4
 * @example bracketedRoot((x) => x * x - 2, { a: 1, fa: -1, b: 2, fb: 2 }) // 1.414213562373095
 */
export const bracketedRoot = (f: (x: number) => number, bracket: Bracket): number => {
  let { a, fa, b, fb } = bracket;
  let [c, fc] = [a, fa];
  let step = b - a;
  let previous = step;
  for (let count = 0; count < MAX_EVALUATIONS; count += 1) {
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = previous = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const tolerance = RELATIVE * Math.abs(b);
    const half = (c - b) / 2;
    if (fb === 0 || Math.abs(half) <= tolerance) return b;
    const next = Math.abs(previous) >= tolerance && Math.abs(fa) > Math.abs(fb) ? interpolatedStep({ a, fa, b, fb }, c, fc) : 0;
    if (next * half > 0 && 2 * Math.abs(next) < Math.min(3 * Math.abs(half) - tolerance, Math.abs(previous))) {
      previous = step;
      step = next;
    } else step = previous = half;
    a = b;
    fa = fb;
    b += Math.abs(step) > tolerance ? step : Math.sign(half) * tolerance;
    fb = f(b);
  }
  return b;
};

/** Step from b by the secant through a and b, or by the inverse parabola through a, b and c. */
const interpolatedStep = ({ a, fa, b, fb }: Bracket, c: number, fc: number): number => {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  return (s * ((c - b) * q * (q - r) - (b - a) * (r - 1))) / -((q - 1) * (r - 1) * (s - 1));
};
