import type { Loop } from '@/contract';
import type { Complex } from '@/analysis/numbers/complex';
import { LoopError } from './loop-error';
import type { Rational } from './model';
import { fromCoefficients } from './rational';

type PlantModel = Loop['plant'];
type CoefficientsPlant = Extract<PlantModel, { kind: 'coefficients' }>;
type RootsPlant = Extract<PlantModel, { kind: 'roots' }>;

/** Conjugates written by hand may differ in their last digits. */
const SAME_CONJUGATE = 1e-9;

/**
 * The plant of a Loop as one rational function and its dead time, exact.
 * @throws LoopError for a zero or improper plant, a missing conjugate, or a formula, which is read elsewhere first
 */
export const buildPlant = (plant: PlantModel): { rational: Rational; deadTime: number } => {
  if (plant.kind === 'formula')
    throw new LoopError({
      pointer: '/plant/kind',
      detail: 'A formula is read into roots before the loop is analysed.',
      code: 'unsupported',
    });
  const rational = plant.kind === 'coefficients' ? fromPolynomials(plant) : fromRoots(plant);
  return { rational, deadTime: plant.deadTime };
};

const fromPolynomials = ({ numerator, denominator }: CoefficientsPlant): Rational => {
  if (denominator.every((c) => c === 0))
    throw new LoopError({ pointer: '/plant/denominator', detail: 'The denominator is zero.', code: 'zeroPlant' });
  if (numerator.every((c) => c === 0))
    throw new LoopError({
      pointer: '/plant/numerator',
      detail: 'The plant is zero: nothing the controller does reaches the output.',
      code: 'zeroPlant',
    });
  const rational = fromCoefficients(numerator, denominator);
  if (rational.zeros.length > rational.poles.length)
    throw improper(
      '/plant/numerator',
      'The numerator has a higher power of s than the denominator: no real plant differentiates its input.',
    );
  return rational;
};

const fromRoots = ({ gain, zeros, poles }: RootsPlant): Rational => {
  if (gain === 0)
    throw new LoopError({
      pointer: '/plant/gain',
      detail: 'The plant is zero: nothing the controller does reaches the output.',
      code: 'zeroPlant',
    });
  if (zeros.length > poles.length)
    throw improper('/plant/zeros', 'There are more zeros than poles: no real plant differentiates its input.');
  return { gain, zeros: withPairedConjugates(zeros, '/plant/zeros'), poles: withPairedConjugates(poles, '/plant/poles') };
};

const improper = (pointer: string, detail: string) => new LoopError({ pointer, detail, code: 'improperPlant' });

/** Real roots, then exact conjugate pairs. */
const withPairedConjugates = (roots: readonly Complex[], pointer: string): Complex[] => {
  const real = roots.filter((root) => root.im === 0).map(({ re }) => ({ re, im: 0 }));
  const lower = roots.map((root, index) => ({ ...root, index })).filter((root) => root.im < 0);
  const pairs = roots.flatMap((root, index) => {
    if (root.im <= 0) return [];
    const tolerance = SAME_CONJUGATE * Math.hypot(root.re, root.im);
    const match = lower.findIndex((other) => Math.hypot(other.re - root.re, other.im + root.im) <= tolerance);
    if (match < 0) throw missing(pointer, index, root);
    lower.splice(match, 1);
    return [
      { re: root.re, im: root.im },
      { re: root.re, im: -root.im },
    ];
  });
  if (lower.length > 0) throw missing(pointer, lower[0].index, lower[0]);
  return [...real, ...pairs];
};

const missing = (pointer: string, index: number, { re, im }: Complex) =>
  new LoopError({
    pointer: `${pointer}/${index}`,
    detail: `The conjugate of this root, ${re} ${im > 0 ? '−' : '+'} ${Math.abs(im)}i, is missing.`,
    code: 'missingConjugate',
  });
