import { formatNumber } from '@/figures/format';
import { mostCases } from '@/contract';

const whole = (count: number) => formatNumber(count, 0);

/** Counts of a grid's lists, those that are used. */
export const gridSize = (counts: readonly number[]): number => (counts.length === 0 ? 0 : counts.reduce((size, count) => size * count, 1));

/** "7 × 4 = 28 cases, at most 400" */
export function sizeText(counts: readonly number[]): string {
  const size = gridSize(counts);
  const product = counts.length > 1 ? `${counts.map(whole).join(' × ')} = ` : '';
  return `${product}${whole(size)} ${size === 1 ? 'case' : 'cases'}, at most ${mostCases}`;
}

/** Why a grid is too large, beside those that there are; null where it is not. @param there cases that stay */
export function tooLarge(counts: readonly number[], there: number): string | null {
  const size = gridSize(counts);
  if (size > mostCases) return `This grid has ${whole(size)} cases; at most ${mostCases} are allowed.`;
  if (size + there > mostCases) return `There are ${there} cases already: ${mostCases - there} more fit, this grid adds ${whole(size)}.`;
  return null;
}
