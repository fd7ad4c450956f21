import { formatFrequency, formatSeconds, withUnit } from '@/figures';
import type { ChartDesign, ChartUnits, TimePanel } from './chart-types';
import { useCursor } from './cursor-provider';
import { ReadOutLine } from './read-out-line';
import { ReadOutTable } from './read-out-table';
import { loopCells, responseCell } from './tables';

export interface ReadOutProps {
  a: ChartDesign;
  b?: ChartDesign;
  units: ChartUnits;
  /** One line of A on a phone, a table of A and B on wide. */
  layout: 'line' | 'table';
}

const letters = { a: 'A', b: 'B' } as const;

/** What both loops are at the frequency of the cursor; at A's crossover while no cursor stands. */
export function ReadOut({ a, b, units, layout }: ReadOutProps) {
  const [cursor] = useCursor('frequency');
  const frequency = cursor ?? a.analysis.margins.phase?.frequency ?? 1;
  const place = withUnit(formatFrequency(frequency, units.frequency), units.frequency);
  const magnitude = units.magnitude === 'dB' ? 'dB' : '';
  if (layout === 'line') {
    const [gain, phase, s, t] = loopCells(a, frequency, units.magnitude);
    const cells = [
      { name: '|L|', value: gain, unit: magnitude },
      { name: 'arg L', value: phase, unit: '°' },
      { name: '|S|', value: s },
      { name: '|T|', value: t },
    ];
    return <ReadOutLine place={place} cells={cells} />;
  }
  const row = (design: 'a' | 'b', from: ChartDesign) => ({ design, label: from.label, cells: loopCells(from, frequency, units.magnitude) });
  const rows = b === undefined ? [row('a', a)] : [row('a', a), row('b', b)];
  return <ReadOutTable place={place} columns={[`|L| ${units.magnitude}`, 'arg L °', '|S|', '|T|']} rows={rows} />;
}

export interface TimeReadOutProps extends Omit<ReadOutProps, 'units'> {
  panels: readonly TimePanel[];
}

/** What the responses are at the time of the time cursor; at 0 while none stands. */
export function TimeReadOut({ a, b, layout, panels }: TimeReadOutProps) {
  const [cursor] = useCursor('time');
  const time = cursor ?? 0;
  const place = `${formatSeconds(time)} s`;
  const designs =
    b === undefined
      ? [{ key: 'a' as const, from: a }]
      : [
          { key: 'a' as const, from: a },
          { key: 'b' as const, from: b },
        ];
  if (layout === 'line') {
    const cells = panels.flatMap(({ kind, unit }) =>
      (kind === 'control' ? designs.slice(0, 1) : designs).map(({ key, from }) => ({
        name: kind === 'control' ? 'control' : letters[key],
        value: responseCell(from, kind, time),
        unit,
        design: key,
      })),
    );
    return <ReadOutLine place={place} cells={cells} />;
  }
  const rows = designs.map(({ key, from }) => ({
    design: key,
    label: from.label,
    cells: panels.map(({ kind }) => responseCell(from, kind, time)),
  }));
  return <ReadOutTable place={place} columns={panels.map(({ kind, unit }) => withUnit(kind, unit))} rows={rows} />;
}
