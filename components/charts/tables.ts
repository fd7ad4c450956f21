import { range } from 'd3-array';
import {
  type ChartDesign,
  formatDegrees,
  formatFactor,
  formatFrequency,
  formatMagnitude,
  formatNumber,
  formatSeconds,
  type Interval,
  interpolateAt,
  type LoopScene,
  telltaleFrequencies,
  type TimePanel,
  timeSeriesOf,
} from '@/figures';
import type { TableContent } from './data-table';

const ROWS = 40;

/** Frequencies evenly spread on the log axis, and the crossovers and peaks of A among them, ascending. */
function tableFrequencies({ a }: LoopScene, [low, high]: Interval): number[] {
  const even = range(ROWS).map((i) => low * (high / low) ** (i / (ROWS - 1)));
  const telltale = telltaleFrequencies(a.analysis).filter((f) => f > low && f < high);
  return [...even, ...telltale].sort((x, y) => x - y);
}

/** What the table, the read-out and a screen reader say of a loop at one frequency, without units. */
export function loopCells(design: ChartDesign, frequency: number, magnitude: 'dB' | 'factor'): string[] {
  const point = design.at(frequency);
  return [
    formatMagnitude(point.magnitude, magnitude),
    formatDegrees(point.phaseDegrees),
    formatFactor(point.sensitivity),
    formatFactor(point.complementarySensitivity),
  ];
}

/** Exact values of A, and of B beside them, over the window of a chart. */
export function frequencyTable(scene: LoopScene, window: Interval): TableContent {
  const { units, a, b } = scene;
  const names = (label: string) =>
    [`|L| ${units.magnitude}`, 'arg L °', '|S|', '|T|'].map((name) => (b === undefined ? name : `${label}: ${name}`));
  const rows = tableFrequencies(scene, window).map((frequency) => [
    formatFrequency(frequency, units.frequency),
    ...loopCells(a, frequency, units.magnitude),
    ...(b === undefined ? [] : loopCells(b, frequency, units.magnitude)),
  ]);
  const distinct = rows.filter((row, i) => i === 0 || row[0] !== rows[i - 1][0]);
  return {
    caption: `Loop gain and sensitivity by frequency, ${a.label}${b === undefined ? '' : ` and ${b.label}`}`,
    columns: [units.frequency, ...names(a.label), ...(b === undefined ? [] : names(b.label))],
    rows: distinct,
  };
}

/** The value of a response at a time as it is printed; an en dash where there is none. */
export function responseCell(design: ChartDesign, kind: TimePanel['kind'], time: number): string {
  const series = timeSeriesOf(design, kind);
  const value = series === null ? null : interpolateAt(series.time, series.values, time);
  return value === null ? '–' : formatNumber(value, 2);
}

/** The responses of A, and of B beside them, over the window of a time sheet. */
export function timeTable({ a, b }: LoopScene, panels: readonly TimePanel[], [start, end]: Interval): TableContent {
  const designs = b === undefined ? [a] : [a, b];
  const name = (design: ChartDesign, panel: TimePanel) => `${b === undefined ? '' : `${design.label}: `}${panel.title}, ${panel.unit}`;
  return {
    caption: `${panels.map(({ title }) => title).join(', ')} by time`,
    columns: ['s', ...designs.flatMap((design) => panels.map((panel) => name(design, panel)))],
    rows: range(ROWS + 1).map((i) => {
      const time = start + ((end - start) * i) / ROWS;
      return [formatSeconds(time), ...designs.flatMap((design) => panels.map((panel) => responseCell(design, panel.kind, time)))];
    }),
  };
}
