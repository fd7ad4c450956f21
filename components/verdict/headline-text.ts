import type { Headline } from '@/contract';
import { formatFrequency } from '@/figures/format';
import { quantityName, quantityText, type ReaderUnits } from '@/figures/quantity-text';

export interface HeadlineText {
  /** The quantity, where a number stands beside it. */
  quantity: string | null;
  /** The number with its unit, or the word in its place. */
  value: string;
  /** Whether words stand in the number's place. */
  words: boolean;
  /** "at most 1.70", where a limit is demanded. */
  limit: string | null;
  /** "at 4.84 rad/s", where the number belongs to a frequency. */
  frequency: string | null;
}

const mostly: readonly Headline['quantity'][] = [
  'ms',
  'mt',
  'noiseGain',
  'overshootPercent',
  'undershootPercent',
  'settlingTime',
  'riseTime',
];

/** What a headline says in words and digits, for a block, a row and a sentence alike. */
export function headlineText(headline: Headline, units: ReaderUnits): HeadlineText {
  const { quantity, value, limit, frequency, unstableCases, reason } = headline;
  const number = value === null ? null : quantityText(quantity, value, units).text;
  const bound = mostly.includes(quantity) ? 'at most' : 'at least';
  const shared = {
    limit: limit === null ? null : `${bound} ${quantityText(quantity, limit, units).text}`,
    frequency: frequency === null ? null : `at ${formatFrequency(frequency, units.frequency)} ${units.frequency}`,
  };
  if (unstableCases > 0) return { ...shared, quantity: null, value: 'unstable', words: false, frequency: null };
  if (number === null) return { ...shared, quantity: null, value: reason ?? 'no number', words: true };
  return { ...shared, quantity: quantityName(quantity), value: number, words: false };
}
