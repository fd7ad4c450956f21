import { magnitude, type Complex } from './complex';

/** Below this multiple of its magnitude an imaginary part is rounding, not a pair. */
const REAL = 1e-13;

/**
 * Approximate roots of a real polynomial made exactly symmetric: real roots first, then pairs (re, +im), (re, −im).
 * Each root of the upper half-plane is averaged with its nearest partner below; what finds none is real.
 */
export const pairConjugates = (roots: readonly Complex[]): Complex[] => {
  const real: number[] = [];
  const upper: Complex[] = [];
  const lower: Complex[] = [];
  for (const root of roots) {
    if (Math.abs(root.im) <= REAL * magnitude(root.re, root.im)) real.push(root.re);
    else (root.im > 0 ? upper : lower).push(root);
  }
  upper.sort((a, b) => b.im - a.im);
  const pairs: Complex[] = [];
  for (const root of upper) {
    const nearest = nearestIndex(lower, { re: root.re, im: -root.im });
    if (nearest < 0) {
      real.push(root.re);
      continue;
    }
    const [partner] = lower.splice(nearest, 1);
    pairs.push({ re: (root.re + partner.re) / 2, im: (root.im - partner.im) / 2 });
  }
  lower.forEach((root) => real.push(root.re));
  const byMagnitude = (a: number, b: number) => Math.abs(a) - Math.abs(b) || a - b;
  pairs.sort((a, b) => magnitude(a.re, a.im) - magnitude(b.re, b.im));
  return [
    ...real.sort(byMagnitude).map((re) => ({ re, im: 0 })),
    ...pairs.flatMap(({ re, im }) => [
      { re, im },
      { re, im: -im },
    ]),
  ];
};

/** Index of the point nearest to `target`, or −1 where there is none. */
const nearestIndex = (points: readonly Complex[], target: Complex): number => {
  let best = -1;
  let least = Infinity;
  points.forEach((point, i) => {
    const distance = magnitude(point.re - target.re, point.im - target.im);
    if (distance < least) {
      least = distance;
      best = i;
    }
  });
  return best;
};
