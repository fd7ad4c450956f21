import { parseNumber } from '@/components/ui/parse-number';
import type { ComplexNumber } from '@/contract';
import { rootsText, rootText } from './root-text';

const NUMBER = String.raw`(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?`;
/** "−0.5 ± 3i", "3j", "-0.5+3i": a real part or none, a sign or ±, a size or none, i or j. */
const COMPLEX = new RegExp(String.raw`^(?:([+-]?\s*${NUMBER})\s*(?=[+±-]))?([+±-]?)\s*(${NUMBER})?\s*\*?\s*[ij](?![a-z0-9.])`, 'i');
const REAL = new RegExp(String.raw`^[+-]?\s*${NUMBER}(?![a-z0-9.])`, 'i');
const BETWEEN = /^[\s,;]+/;
/** Conjugates written by hand may differ in their last digits. */
const SAME_CONJUGATE = 1e-9;

export type ParsedRoots = { roots: ComplexNumber[] } | { problem: string };

const size = (text: string | undefined): number => parseNumber((text ?? '1').replace(/\s/g, '')) ?? NaN;

/** A comma is a decimal comma where semicolons divide the list. */
const tidied = (text: string): string => {
  const plain = text.replace(/[−–]/g, '-').replace(/\+\s*\/?\s*-/g, '±');
  return (plain.includes(';') ? plain.replace(/(\d),(?=\d)/g, '$1.') : plain).trim();
};

/** The root or the pair that a text begins with, and how long it is; null where it begins with none. */
function firstRoot(text: string): { length: number; roots: ComplexNumber[] } | null {
  const complex = COMPLEX.exec(text);
  if (complex) {
    const [{ length }, real, sign, imaginary] = complex;
    const re = real === undefined ? 0 : size(real);
    const im = size(imaginary);
    if (sign === '±' || im === 0) return { length, roots: im === 0 ? [{ re, im }] : [{ re, im }, { re, im: -im }] }; // prettier-ignore
    return { length, roots: [{ re, im: sign === '-' ? -im : im }] };
  }
  const real = REAL.exec(text);
  return real && { length: real[0].length, roots: [{ re: size(real[0]), im: 0 }] };
}

/** The first root whose conjugate is missing. */
function loneRoot(roots: readonly ComplexNumber[]): ComplexNumber | undefined {
  const unpaired: ComplexNumber[] = [];
  for (const root of roots.filter(({ im }) => im !== 0)) {
    const near = SAME_CONJUGATE * Math.hypot(root.re, root.im);
    const partner = unpaired.findIndex(({ re, im }) => Math.hypot(re - root.re, im + root.im) <= near);
    if (partner < 0) unpaired.push(root);
    else unpaired.splice(partner, 1);
  }
  return unpaired[0];
}

const loneProblem = ({ re, im }: ComplexNumber): string => {
  const pair = rootsText([{ re, im: Math.abs(im) }]);
  return `${rootText({ re, im })} stands alone. Write the pair as ${pair}, or add ${rootText({ re, im: -im })}.`;
};

/**
 * Poles or zeros as people write them, divided by commas, semicolons or blanks. ± stands for both of a pair; i and j are the same.
 *
 * @returns the roots with their conjugates, or what is wrong with the first piece that is none
 * @example parseRoots('-2, -0.5 ± 3j') // { roots: [{ re: -2, im: 0 }, { re: -0.5, im: 3 }, { re: -0.5, im: -3 }] }
 */
export function parseRoots(text: string): ParsedRoots {
  const roots: ComplexNumber[] = [];
  let rest = tidied(text);
  while (rest !== '') {
    const next = firstRoot(rest);
    if (next === null) return { problem: `“${/^[^,;\s]*/.exec(rest)?.[0] || rest[0]}” is not a root. Write it as in −2 or −0.5 ± 3i.` };
    roots.push(...next.roots);
    rest = rest.slice(next.length);
    const between = BETWEEN.exec(rest)?.[0] ?? '';
    if (/[,;]\s*[,;]/.test(between)) return { problem: 'A root is missing between two commas.' };
    if (rest !== '' && between === '' && !/^[+-]/.test(rest))
      return { problem: `“${rest}” is not a root. Write it as in −2 or −0.5 ± 3i.` };
    rest = rest.slice(between.length);
  }
  const lone = loneRoot(roots);
  return lone ? { problem: loneProblem(lone) } : { roots };
}
