import type { ChartSheet } from './chart-sheet';

type Place = ChartSheet | 'frequency' | 'plane' | 'time';

/** The id of the region where a chart stands. */
export const chartsId = (place: Place): string => `charts-${place}`;

/** On a wide screen some sheets stand in one chart. */
const together: Readonly<Record<ChartSheet, Place>> = {
  bode: 'frequency',
  nyquist: 'plane',
  sensitivity: 'frequency',
  step: 'time',
  load: 'time',
};

/** Gives the keyboard to a chart's cursor and brings the chart into view, whichever layout it stands in. */
export function focusChart(sheet: ChartSheet): void {
  const region = document.getElementById(chartsId(sheet)) ?? document.getElementById(chartsId(together[sheet]));
  if (region === null) return;
  // A chart that shows its table has no cursor.
  const keyed = region.querySelector<HTMLElement>('[role=slider]') ?? region.querySelector<HTMLElement>('[role=region]');
  keyed?.focus({ preventScroll: true });
  region.scrollIntoView({ block: 'nearest' });
}
