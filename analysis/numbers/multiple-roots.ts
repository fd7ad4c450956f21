import type { Complex } from './complex';
import { expandRoots } from './polynomial';

/** Roots nearer than this, relative to their magnitude, may be one root that rounding split: ε^(1/m) for m up to 5. */
const NEAR = 2e-3;
/** How far coefficients may move, in roundings of what each one's terms sum to, when a cluster becomes one multiple root. */
const SAME = 64 * 2 ** -53;
const NEWTON_STEPS = 4;

/**
 * Rounding splits an m-fold root into a ring of radius about ε^(1/m). The m-fold root itself is a simple root of the
 * (m−1)th derivative, so it can be had to full precision there. A ring becomes that root, and a root beside the imaginary
 * axis moves onto it, where expanding the result gives the coefficients back: where they cannot tell the difference.
 *
 * @param roots with exactly paired conjugates
 * @param ascending the coefficients they came from
 * @see REFERENCES Zeng 2005
 */
export const collapseClusters = (roots: readonly Complex[], ascending: readonly number[]): Complex[] => {
  const upper = roots.filter((root) => root.im >= 0);
  const whole = clusters(upper).map((members) => collapsed(members, ascending));
  const everyRing = withConjugates(whole.flat());
  const merged = everyRing.length === roots.length && reproduces(everyRing, ascending) ? everyRing : [...roots];
  return ontoAxis(merged, ascending);
};

/** Groups of roots that are near each other, by single linkage. */
const clusters = (roots: readonly Complex[]): Complex[][] => {
  const groups: Complex[][] = [];
  for (const root of roots) {
    const touching = groups.filter((group) => group.some((member) => near(member, root)));
    const rest = groups.filter((group) => !touching.includes(group));
    groups.splice(0, groups.length, ...rest, [...touching.flat(), root]);
  }
  return groups;
};

const near = (a: Complex, b: Complex): boolean =>
  Math.hypot(a.re - b.re, a.im - b.im) <= NEAR * Math.max(Math.hypot(a.re, a.im), Math.hypot(b.re, b.im));

/** The members of one ring (upper half-plane) as one root repeated; real where the ring reaches the real axis. */
const collapsed = (members: readonly Complex[], ascending: readonly number[]): Complex[] => {
  const isReal = members.some((z) => z.im <= NEAR * Math.abs(z.re));
  const multiplicity = isReal ? members.reduce((count, z) => count + (z.im === 0 ? 1 : 2), 0) : members.length;
  if (multiplicity === 1) return [...members];
  const centre = { re: mean(members.map((z) => z.re)), im: isReal ? 0 : mean(members.map((z) => z.im)) };
  const root = newton(derivative(ascending, multiplicity - 1), centre);
  return Array.from({ length: multiplicity }, () => root);
};

/** Roots that rounding cannot tell from the imaginary axis, moved onto it. */
const ontoAxis = (roots: readonly Complex[], ascending: readonly number[]): Complex[] =>
  roots.reduce<Complex[]>(
    (settled, root, i) => {
      if (root.re === 0 || root.im <= 0 || Math.abs(root.re) > NEAR * root.im) return settled;
      const moved = settled.map((z, j) => (j === i || j === i + 1 ? { re: 0, im: z.im } : z));
      return reproduces(moved, ascending) ? moved : settled;
    },
    [...roots],
  );

const withConjugates = (upper: readonly Complex[]): Complex[] => [
  ...upper.filter((z) => z.im === 0),
  ...upper.filter((z) => z.im > 0).flatMap((z) => [z, { re: z.re, im: -z.im }]),
];

const mean = (values: readonly number[]): number => values.reduce((sum, x) => sum + x, 0) / values.length;

/** The kth derivative divided by k!, in ascending powers. */
const derivative = (ascending: readonly number[], k: number): number[] => {
  let coefficients = [...ascending];
  for (let order = 1; order <= k; order += 1) coefficients = coefficients.slice(1).map((c, i) => (c * (i + 1)) / order);
  return coefficients;
};

const newton = (ascending: readonly number[], start: Complex): Complex => {
  let { re, im } = start;
  for (let step = 0; step < NEWTON_STEPS; step += 1) {
    let [valueRe, valueIm, slopeRe, slopeIm] = [0, 0, 0, 0];
    for (let k = ascending.length - 1; k >= 0; k -= 1) {
      [slopeRe, slopeIm] = [slopeRe * re - slopeIm * im + valueRe, slopeRe * im + slopeIm * re + valueIm];
      [valueRe, valueIm] = [valueRe * re - valueIm * im + ascending[k], valueRe * im + valueIm * re];
    }
    const square = slopeRe * slopeRe + slopeIm * slopeIm;
    re -= (valueRe * slopeRe + valueIm * slopeIm) / square;
    im -= (valueIm * slopeRe - valueRe * slopeIm) / square;
  }
  return { re, im };
};

/** Whether expanding the roots gives the coefficients back to rounding, each measured against what its terms sum to. */
const reproduces = (roots: readonly Complex[], ascending: readonly number[]): boolean => {
  const lead = ascending[ascending.length - 1];
  const expanded = expandRoots(roots);
  const magnitudes = expandRoots(roots.map(({ re, im }) => ({ re: -Math.hypot(re, im), im: 0 })));
  return expanded.every((c, k) => Math.abs(c * lead - ascending[ascending.length - 1 - k]) <= SAME * Math.abs(lead) * magnitudes[k]);
};
