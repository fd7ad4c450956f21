import { parseNumber } from '@/components/ui/parse-number';

const LONGEST_S = 1e4;

/** A time of 0 to 10,000 s, or what is wrong with it. */
export function readTime(text: string, name: string): number | string {
  const seconds = parseNumber(text);
  if (seconds === null) return `${name} is a number, as in 0.08.`;
  if (seconds < 0) return `${name} is 0 or more.`;
  return seconds > LONGEST_S ? `${name} is at most 10,000 s.` : seconds;
}
