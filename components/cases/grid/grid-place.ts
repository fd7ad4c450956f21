import type { Units } from '@/components/ui/units';
import { axisName, axisNumber, axisText, axisUnit, placeText } from '@/figures/axis-text';
import type { CaseGridLayout, GridRow } from '../model/case-grid';
import type { CaseNumber } from '../model/case-number';
import { worstNumber } from '../model/worst-number';
import type { Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';
import { basisWords } from '../basis-words';

/** "1,380 kg"; where the cases have one axis alone, what the cells show. */
export const rowName = ({ place }: GridRow, units: Units): string => placeText(place, units.speed) || 'All cases';

export const columnName = ({ column }: CaseGridLayout, at: number, units: Units): string => axisNumber(column, at, units.speed);

/** "load, speed in km/h" */
export function cornerName({ column, rowAxes }: CaseGridLayout, units: Units): string {
  const along = `${axisName(column).toLowerCase()} in ${axisUnit(column, units.speed)}`;
  return rowAxes.length === 0 ? along : `${rowAxes.map((axis) => axisName(axis).toLowerCase()).join(', ')}, ${along}`;
}

export const placeOf = (layout: CaseGridLayout, at: number, units: Units): string => axisText(layout.column, at, units.speed);

/** Several cases at one place: the worst stands for them. */
export const standsFor = (numbers: readonly CaseNumber[], quantity: Quantity): CaseNumber | null =>
  worstNumber(numbers, quantity) ?? numbers[0] ?? null;

/** What a cell says to those who listen. */
export function cellLabel({ view, text, verdict }: CaseNumber, quantity: Quantity, worst: boolean): string {
  const parts = [
    view.kept.name,
    `${quantityName(quantity)} ${text}${view.outdated ? ' before the case changed' : ''}`,
    verdict && verdictWords[verdict],
    basisWords[view.kept.basis].tag,
    worst && 'nearest the edge of all',
  ];
  return parts.filter(Boolean).join(', ');
}
