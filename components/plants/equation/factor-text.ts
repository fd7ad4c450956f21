import type { ComplexNumber } from '@/contract';
import { coefficientText, polynomialText, superscript } from './polynomial-text';

const isOrigin = ({ re, im }: ComplexNumber): boolean => re === 0 && im === 0;

/** Each text once, with how often it occurs as its power. */
function powers(texts: readonly string[]): string[] {
  return [...new Set(texts)].map((text) => {
    const times = texts.filter((other) => other === text).length;
    return times === 1 ? text : `${text}${superscript(times)}`;
  });
}

/**
 * gain·Π(s − root) as it is read: powers of s first, then brackets. A pair is one quadratic, so that only real numbers are printed.
 *
 * @example factorText(6, [{ re: 0, im: 0 }, { re: -0.5, im: 0 }]) // "6 s (s + 0.5)"
 */
export function factorText(gain: number, roots: readonly ComplexNumber[]): string {
  const factors = roots
    .filter((root) => root.im >= 0 && !isOrigin(root))
    .map(({ re, im }) => polynomialText(im === 0 ? [1, -re] : [1, -2 * re, re * re + im * im]));
  const origin = powers(roots.filter(isOrigin).map(() => 's'));
  if (gain === 1 && factors.length === 1 && origin.length === 0) return factors[0];
  const brackets = powers(factors.map((factor) => `(${factor})`)).join('');
  const parts = [...origin, brackets].filter((part) => part !== '');
  if (parts.length === 0) return coefficientText(gain);
  if (Math.abs(gain) === 1) return `${gain < 0 ? '−' : ''}${parts.join(' ')}`;
  return [coefficientText(gain), ...parts].join(' ');
}
