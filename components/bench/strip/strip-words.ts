import { headlineText } from '@/components/verdict/headline-text';
import type { Headline } from '@/contract';
import type { ReaderUnits } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';

/** The headline in one sentence, for those who listen while a gain moves. */
export function spokenHeadline(headline: Headline, units: ReaderUnits): string {
  const { quantity, value } = headlineText(headline, units);
  const where = headline.case === null ? '' : `, ${headline.case.name}`;
  return `${[quantity, value].filter(Boolean).join(' ')}, ${verdictWords[headline.verdict]}${where}.`;
}
