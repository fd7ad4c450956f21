import type { TimeSeries } from '@/contract';
import type { ChartDesign } from './loop-picture';

/** One panel of a time sheet; its title says what is shown after what ("Speed after a 1 m/s step"). */
export interface TimePanel {
  kind: 'reference' | 'load' | 'control';
  title: string;
  unit: string;
  height?: number;
}

/** The series that a panel shows; null where the loop gives no time response. */
export function timeSeriesOf(
  { analysis }: Pick<ChartDesign, 'analysis'>,
  kind: TimePanel['kind'],
): { time: number[]; values: number[] } | null {
  const series: TimeSeries | undefined = kind === 'load' ? analysis.timeResponse?.load : analysis.timeResponse?.reference;
  if (series === undefined) return null;
  return { time: series.time, values: kind === 'control' ? series.control : series.output };
}
