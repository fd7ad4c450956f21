import { PlaneProduct } from '@/analysis/loop/plane-product';
import type { Rational } from '@/analysis/loop/model';
import { magnitude, type Complex } from '@/analysis/numbers/complex';
import { pairConjugates } from '@/analysis/numbers/conjugates';
import { ehrlichAberth, type NewtonStep } from '@/analysis/numbers/ehrlich-aberth';
import { startingPoints } from '@/analysis/numbers/newton-polygon';
import { add, expandRoots } from '@/analysis/numbers/polynomial';

/**
 * Closed-loop poles of a loop that is a product of rational functions: the zeros of denominator + numerator, nothing cancelled.
 *
 * Both stay factored. The expanded sum only gives starting points; the iteration itself reads 1 + L and its derivative
 * from the factors, which keeps digits that expanded coefficients of twelve poles over three decades no longer hold.
 *
 * @see REFERENCES Aberth 1973
 */
export const closedLoopPoles = (parts: readonly Rational[]): Complex[] => {
  const start = initialPoints(parts);
  return pairConjugates(ehrlichAberth(start, characteristicStep(new PlaneProduct(parts))));
};

/**
 * Newton's step for f = D + N = D·(1 + L): f′/f = (D′/D + L·N′/N)/(1 + L), written with 1/L where |L| > 1.
 * Final where 1 + L is within the rounding that its parts carry, or where N and D vanish together.
 */
const characteristicStep =
  (loop: PlaneProduct): NewtonStep =>
  (re, im, step) => {
    loop.evaluate(re, im);
    const { top, bottom } = loop;
    if (top.isZero && bottom.isZero) {
      step.fill(0);
      return true;
    }
    const large = loop.re * loop.re + loop.im * loop.im > 1;
    const square = loop.re * loop.re + loop.im * loop.im;
    const x = large ? loop.re / square : loop.re;
    const y = large ? -loop.im / square : loop.im;
    const [own, other] = large ? [top, bottom] : [bottom, top];
    const slopeRe = own.slopeRe + x * other.slopeRe - y * other.slopeIm;
    const slopeIm = own.slopeIm + x * other.slopeIm + y * other.slopeRe;
    const length = slopeRe * slopeRe + slopeIm * slopeIm;
    step[0] = ((1 + x) * slopeRe + y * slopeIm) / length;
    step[1] = (y * slopeRe - (1 + x) * slopeIm) / length;
    return magnitude(1 + x, y) <= loop.uncertainty;
  };

/** As many points as there are closed-loop poles, of about their magnitudes. */
const initialPoints = (parts: readonly Rational[]): Complex[] => {
  const zeros = parts.flatMap((part) => part.zeros);
  const poles = parts.flatMap((part) => part.poles);
  const gain = parts.reduce((product, part) => product * part.gain, 1);
  const scale = meanMagnitude([...zeros, ...poles]);
  const shrink = (roots: readonly Complex[]) => roots.map(({ re, im }) => ({ re: re / scale, im: im / scale }));
  const scaledGain = gain * scale ** (zeros.length - poles.length);
  const sum = add(
    expandRoots(shrink(poles)),
    expandRoots(shrink(zeros)).map((c) => c * scaledGain),
  );
  const atOrigin = sum.length - 1 - sum.findLastIndex((c) => c !== 0);
  const away = startingPoints(sum.slice(0, sum.length - atOrigin).reverse());
  const near = Array.from({ length: atOrigin }, () => ({ re: 0, im: 0 }));
  return [...near, ...away].map(({ re, im }) => ({ re: re * scale, im: im * scale }));
};

/** Geometric mean of the non-zero magnitudes; 1 where there are none. */
const meanMagnitude = (roots: readonly Complex[]): number => {
  const logs = roots.map(({ re, im }) => Math.log(magnitude(re, im))).filter((log) => log > -Infinity);
  return logs.length === 0 ? 1 : Math.exp(logs.reduce((sum, log) => sum + log, 0) / logs.length);
};
