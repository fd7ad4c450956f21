import { quantities } from '@/analysis/project';
import type { LapChartProps } from '@/components/charts';
import type { Units } from '@/components/ui/units';
import { demandText } from '@/components/verdict/demand-text';
import type { Axis, Limit, OperatingRange, Quantity } from '@/contract';
import { axisFrom, axisIn, axisName, axisNumber, axisText, axisUnit } from '@/figures/axis-text';
import { formatFrequency, withUnit } from '@/figures/format';
import type { LapLine } from '@/figures/lap-chart';
import type { LapDemand } from '@/figures/lap-labels';
import { quantityName, quantityText } from '@/figures/quantity-text';
import { frequencyIn, magnitudeIn } from '@/figures/units';
import { rowName, standsFor } from './grid/grid-place';
import type { CaseGridLayout } from './model/case-grid';
import type { CaseNumber } from './model/case-number';

export interface LapReading {
  readonly layout: CaseGridLayout;
  readonly quantity: Quantity;
  readonly numbers: ReadonlyMap<string, CaseNumber>;
  readonly worst: CaseNumber | null;
  /** What was demanded when the numbers were kept. */
  readonly limits: readonly Limit[];
  readonly operatingRange: readonly OperatingRange[];
  readonly units: Units;
  /** What is said of the worst besides its number: its place at the edge. */
  readonly aside: string | null;
}

const inDecibels: readonly Quantity[] = ['gainMargin', 'gainReduction', 'noiseGain'];

/** A value in the unit in which it is printed, for a picture's scale. */
function shownValue(quantity: Quantity, value: number, units: Units): number {
  if (inDecibels.includes(quantity)) return magnitudeIn(units.magnitude, value);
  if (quantity === 'bandwidth') return frequencyIn(units.frequency, value);
  return quantity === 'phaseMargin' ? Math.abs(value) : value;
}

/** "1.63 at 4.84 rad/s" */
function placed({ text, view }: CaseNumber, quantity: Quantity, { frequency: unit }: Units): string {
  const at = view.result && quantities[quantity].frequency(view.result.numbers);
  return at === null ? text : `${text} at ${withUnit(formatFrequency(at, unit), unit)}`;
}

/** What lies beyond an end of what was checked, in words; null where nothing can. */
function beyondEnd(axis: Axis, end: 'low' | 'high', { operatingRange, units }: LapReading): string | null {
  const range = operatingRange.find((one) => one.axis === axis);
  if (end === 'high') return range?.highIsPhysical ? null : 'not checked';
  if (!range?.lowIsPhysical) return 'not checked';
  return range.disengage === null ? null : `lets go below ${axisNumber(axis, range.disengage, units.speed)}`;
}

function linesOf({ layout, quantity, numbers, units }: LapReading) {
  return layout.rows.map((row, r) => ({
    name: layout.rowAxes.length === 0 ? '' : rowName(row, units),
    cells: layout.cells[r].flatMap((views, c) => {
      const shown = standsFor(
        views.flatMap(({ kept }) => numbers.get(kept.id) ?? []),
        quantity,
      );
      return shown === null ? [] : [{ at: axisIn(layout.column, layout.columns[c], units.speed), shown }];
    }),
  }));
}

/** The picture of one number over speed, or over what the cases are laid along, from where they stand. */
export function lapProps(reading: LapReading): Omit<LapChartProps, 'height'> {
  const { layout, quantity, worst, limits, units, aside } = reading;
  const { column } = layout;
  const rows = linesOf(reading);
  const value = ({ value: number }: CaseNumber) => (number === null ? null : shownValue(quantity, number, units));
  const lines = rows.map(({ name, cells }): LapLine => ({ name, points: cells.map(({ at, shown }) => ({ at, value: value(shown) })) }));
  const demands = limits
    .filter((limit) => limit.quantity === quantity)
    .map((limit): LapDemand => ({ bound: limit.bound, limit: shownValue(quantity, limit.limit, units), text: demandText(limit, units) }));
  const line = rows.findIndex(({ cells }) => cells.some(({ shown }) => shown === worst));
  const point = rows[line]?.cells.findIndex(({ shown }) => shown === worst) ?? -1;
  const drawn = worst !== null && point >= 0 && worst.value !== null;
  const undrawn = rows.flatMap(({ cells }) => cells).filter(({ shown }) => shown.value === null && shown.verdict === 'fail').length;
  const unit = quantityText(quantity, 1, units).unit || 'factor';
  const title = `${quantityName(quantity)} over ${axisName(column).toLowerCase()}`;
  const beyond = { low: beyondEnd(column, 'low', reading), high: beyondEnd(column, 'high', reading) };
  const worstWords = worst ? `Nearest the edge: ${worst.view.kept.name}, ${worst.text}.` : '';
  return {
    title,
    units: { number: undrawn === 0 ? unit : `${unit}, ${undrawn} unstable not drawn`, foot: axisUnit(column, units.speed) },
    lines,
    demands,
    worst: drawn ? { line, point, text: [placed(worst, quantity, units), ...(aside === null ? [] : [aside])] } : null,
    beyond,
    tickText: (at) => axisNumber(column, axisFrom(column, at, units.speed), units.speed),
    description: `${title}, ${lines.length === 1 ? 'one line' : `${lines.length} lines, one per load`}. ${demands.map(({ text }) => `Demanded ${text}. `).join('')}${worstWords}`,
    table: () => ({
      caption: title,
      columns: [axisUnit(column, units.speed), ...rows.map(({ name }) => name || quantityName(quantity))],
      rows: layout.columns.map((at) => [
        axisText(column, at, units.speed),
        ...rows.map(({ cells }) => cells.find((cell) => cell.at === axisIn(column, at, units.speed))?.shown.text ?? '–'),
      ]),
    }),
  };
}
