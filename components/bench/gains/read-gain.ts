import { parseNumber } from '@/components/ui/parse-number';
import { type Gain, gainWords, isTime, mustBePositive } from '../draft/gain';
import type { Form } from '../draft/settings';

export type ReadGain = { readonly value: number } | { readonly problem: string };

const LARGEST_GAIN = 1e12;
const LONGEST_TIME = 1e6;

export const HOW_TO_SWITCH_OFF = 'Ti is more than 0. All settings switch integral action off.';

/** A typed gain, within what a design may hold: any number; for a time one that is 0 or more, and for Ti one that is more. */
export function readGain(gain: Gain, form: Form, text: string): ReadGain {
  const value = parseNumber(text);
  const { label } = gainWords(gain, form);
  if (mustBePositive(gain, form) && (text.trim() === '' || (value !== null && value <= 0))) return { problem: HOW_TO_SWITCH_OFF };
  if (value === null) return { problem: 'A number, as in 0.35.' };
  if (!isTime(gain, form)) return Math.abs(value) <= LARGEST_GAIN ? { value } : { problem: `${label} is of magnitude at most 1e12.` };
  if (value < 0) return { problem: `${label} is 0 or more.` };
  return value <= LONGEST_TIME ? { value } : { problem: `${label} is at most 1,000,000 s.` };
}
