import type { Complex } from './complex';

/** Real polynomials as coefficients in descending powers. */

/** Without zero leading coefficients; the zero polynomial is []. */
export const withoutLeadingZeros = (polynomial: readonly number[]): readonly number[] => {
  const first = polynomial.findIndex((c) => c !== 0);
  return first < 0 ? [] : polynomial.slice(first);
};

/** Product of two polynomials. */
export const multiply = (a: readonly number[], b: readonly number[]): number[] => {
  const product = new Array<number>(a.length + b.length - 1).fill(0);
  a.forEach((x, i) => b.forEach((y, j) => (product[i + j] += x * y)));
  return product;
};

/** Sum of two polynomials of any degrees. */
export const add = (a: readonly number[], b: readonly number[]): number[] => {
  const length = Math.max(a.length, b.length);
  return Array.from({ length }, (_, i) => (a[a.length - length + i] ?? 0) + (b[b.length - length + i] ?? 0));
};

/**
 * The monic real polynomial with these roots, conjugates next to each other.
 * Expansion loses the digits that nearly equal or widely spread roots need: evaluate factors where factors are known.
 */
export const expandRoots = (roots: readonly Complex[]): number[] => {
  let polynomial = [1];
  for (let i = 0; i < roots.length; i += 1) {
    const { re, im } = roots[i];
    if (im === 0) polynomial = multiply(polynomial, [1, -re]);
    else {
      polynomial = multiply(polynomial, [1, -2 * re, re * re + im * im]);
      i += 1;
    }
  }
  return polynomial;
};
