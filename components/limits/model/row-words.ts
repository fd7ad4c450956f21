import { quantityName, type ReaderUnits } from '@/figures/quantity-text';
import { withUnit } from '@/figures/format';
import type { Quantity } from '@/contract';
import type { DemandRow } from './demand-row';
import { demandUnit } from './demand-unit';

const longNames: Partial<Record<Quantity, string>> = { ms: 'Sensitivity peak, Ms', mt: 'Peak of T, Mt' };

/** A quantity by its full name, where there is room for it. */
export const longName = (quantity: Quantity): string => longNames[quantity] ?? quantityName(quantity);

export const boundWords = { min: 'at least', max: 'at most' } as const;

/** "at most 1.70, target 1.60, team rule 4", as it was typed. */
export function rowWords({ quantity, bound, limit, target, source }: DemandRow, units: ReaderUnits): string {
  const { name } = demandUnit(quantity, units);
  const said = (text: string) => withUnit(text.trim() || '–', name);
  const parts = [`${boundWords[bound]} ${said(limit.text)}`];
  if (target.text.trim() !== '') parts.push(`target ${said(target.text)}`);
  if (source.trim() !== '') parts.push(source.trim());
  return parts.join(', ');
}
