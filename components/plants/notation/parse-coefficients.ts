import { parseNumber } from '@/components/ui/parse-number';

/** Splits a list as people write it: by semicolons where there are any, by blanks (a comma before one belongs to it) where not, else by commas. */
function split(text: string): string[] {
  const tidy = text.trim();
  if (tidy.includes(';')) return tidy.split(';');
  if (/\s/.test(tidy)) return tidy.split(/\s*,?\s+/);
  return tidy.split(',');
}

/**
 * Coefficients, highest power first. A comma is a decimal comma where semicolons or blanks divide the list.
 *
 * @returns the numbers, or the first piece that is none
 * @example parseCoefficients('0,35 1 0') // { numbers: [0.35, 1, 0] }
 */
export function parseCoefficients(text: string): { numbers: number[] } | { wrong: string } {
  const pieces = split(text);
  const numbers = pieces.map(parseNumber);
  const at = numbers.indexOf(null);
  return at >= 0 ? { wrong: pieces[at].trim() } : { numbers: numbers as number[] };
}
