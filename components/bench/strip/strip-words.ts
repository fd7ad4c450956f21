import { headlineText, type HeadlineText } from '@/components/verdict/headline-text';
import type { Analysis, Headline } from '@/contract';
import type { ReaderUnits } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';

export interface StripWords {
  readonly headline: HeadlineText;
  readonly lines: readonly string[];
  /** The whole in one sentence, for those who listen. */
  readonly spoken: string;
}

const poles = (count: number): string => `${count} ${count === 1 ? 'pole' : 'poles'} on the wrong side`;

/** The headline as the bench sets it: the number, what it is worth, and why where it is worth nothing. */
export function stripWords(headline: Headline, { closedLoop }: Analysis, units: ReaderUnits): StripWords {
  const text = headlineText(headline, units);
  if (!closedLoop.stable) {
    const wrong = poles(closedLoop.unstablePoles);
    return { headline: text, lines: [wrong, 'Margins have no meaning there.'], spoken: `Unstable, ${wrong}.` };
  }
  const lines = [text.frequency, headline.reason].filter((line) => line !== null);
  return { headline: text, lines, spoken: `${text.quantity} ${text.value}, ${verdictWords[headline.verdict]}.` };
}
