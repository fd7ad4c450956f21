import type { Headline } from '@/contract';
import { quantityRules } from '@/contract/quantity-rules';
import { formatFrequency } from '@/figures/format';
import { quantityName, quantityText, type ReaderUnits } from '@/figures/quantity-text';
import { demandText } from './demand-text';
import { edgeWords } from './edge-words';

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

/** What a headline says in words and digits, for a block, a row and a sentence alike. */
export function headlineText(headline: Headline, units: ReaderUnits): HeadlineText {
  const { quantity, value, limit, frequency, unstableCases, reason } = headline;
  const number = value === null ? null : quantityText(quantity, value, units).text;
  const shared = {
    limit: limit === null ? null : demandText({ quantity, bound: quantityRules[quantity].bounds[0], limit }, units),
    frequency: frequency === null ? null : `at ${formatFrequency(frequency, units.frequency)} ${units.frequency}`,
  };
  if (unstableCases > 0) return { ...shared, quantity: null, value: 'unstable', words: false, frequency: null };
  if (number === null) return { ...shared, quantity: null, value: reason ?? 'no number', words: true };
  return { ...shared, quantity: quantityName(quantity), value: number, words: false };
}

/** What stands under the headline's case: of how many it is the worst and where, whether at the edge of what was checked, and why it is not judged. */
export function headlineLines(headline: Headline, text: HeadlineText, caseCount: number): string[] {
  const { unstableCases, reason } = headline;
  if (unstableCases > 0) return [`unstable in ${unstableCases} of ${caseCount}`, 'Margins have no meaning there.'];
  const worst = caseCount === 1 ? 'the only case' : `worst of ${caseCount}`;
  const place = [worst, text.frequency].filter(Boolean).join(', ');
  return [place, edgeWords(headline), text.words ? null : reason].filter((line) => line !== null);
}
