import { parseNumber } from '@/components/ui/parse-number';
import { type Gain, gainWords, mayBeNegative } from '../draft/gain';

export type ReadGain = { readonly value: number } | { readonly problem: string };

const LARGEST_GAIN = 1e12;
const LONGEST_TIME = 1e6;

/** A typed gain, within what a design may hold: any number, and for a time one that is 0 or more. */
export function readGain(gain: Gain, text: string): ReadGain {
  const value = parseNumber(text);
  const { label } = gainWords[gain];
  if (value === null) return { problem: 'A number, as in 0.35.' };
  if (mayBeNegative(gain)) return Math.abs(value) <= LARGEST_GAIN ? { value } : { problem: `${label} is of magnitude at most 1e12.` };
  if (value < 0) return { problem: `${label} is 0 or more.` };
  return value <= LONGEST_TIME ? { value } : { problem: `${label} is at most 1,000,000 s.` };
}
