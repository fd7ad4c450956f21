import type { ComplexNumber } from '@/contract';
import { coefficientText } from '../equation/polynomial-text';

type Print = (value: number) => string;

const imaginary = (im: number, print: Print): string => (Math.abs(im) === 1 ? 'i' : `${print(Math.abs(im))}i`);

/** One root as it is printed. @example rootText({ re: -0.5, im: -3 }) // "−0.5 − 3i" */
export function rootText({ re, im }: ComplexNumber, print: Print = coefficientText): string {
  if (im === 0) return print(re);
  if (re === 0) return `${im < 0 ? '−' : ''}${imaginary(im, print)}`;
  return `${print(re)} ${im < 0 ? '−' : '+'} ${imaginary(im, print)}`;
}

/**
 * Roots as they are printed and can be typed: pairs once, with ±.
 *
 * @example rootsText([{ re: -2, im: 0 }, { re: -0.5, im: 3 }, { re: -0.5, im: -3 }]) // "−2, −0.5 ± 3i"
 */
export const rootsText = (roots: readonly ComplexNumber[], print: Print = coefficientText): string =>
  roots
    .filter(({ im }) => im >= 0)
    .map(({ re, im }) => {
      if (im === 0) return print(re);
      return re === 0 ? `±${imaginary(im, print)}` : `${print(re)} ± ${imaginary(im, print)}`;
    })
    .join(', ');
