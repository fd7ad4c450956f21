import type { Fact } from '@/components/ui/fact-table';
import type { Analysis, TimeMetrics } from '@/contract';
import { formatNumber, withUnit } from '@/figures/format';

/** The units of a plant's command and output; "" where nobody named them. */
export interface PlantUnits {
  input: string;
  output: string;
}

type Row = readonly [name: string, metric: keyof TimeMetrics, unit: string, aside?: string];

const rows = ({ input, output }: PlantUnits, loadPeakTime: number | null): readonly Row[] => {
  const outputSeconds = output === '' ? '' : `s·${output}`;
  return [
    ['Rise time', 'riseTime', 's', '10 to 90 %'],
    ['Settling', 'settlingTime', 's', 'within 2 %'],
    ['Overshoot', 'overshootPercent', '%'],
    ['Undershoot', 'undershootPercent', '%'],
    ['Peak time', 'peakTime', 's'],
    ['Final value', 'finalValue', output],
    ['Steady-state error', 'steadyStateError', output],
    ['IAE', 'iae', outputSeconds, 'integral of |e|'],
    ['ITAE', 'itae', output === '' ? '' : `s²·${output}`, 'integral of t·|e|'],
    ['Control peak', 'controlPeak', input],
    ['Control, total variation', 'controlTotalVariation', input],
    ['Load peak', 'loadPeak', output, loadPeakTime === null ? undefined : `after ${formatNumber(loadPeakTime, 2)} s`],
    ['Load settling', 'loadSettlingTime', 's', 'within 2 % of its peak'],
    ['Load IAE', 'loadIae', outputSeconds],
  ];
};

const decimals = (metric: keyof TimeMetrics) => (metric.endsWith('Percent') ? 1 : 2);

/** How the loop answers a reference step of 1 and a load step of 1; empty where it has no metrics. */
export function responseFacts({ timeResponse }: Analysis, units: PlantUnits): Fact[] {
  const metrics = timeResponse?.metrics;
  if (!metrics) return [];
  return rows(units, metrics.loadPeakTime).map(([name, metric, unit, aside]) => {
    const value = metrics[metric];
    if (value === null) return { name, value: '–', aside: 'not reached' };
    return { name, value: withUnit(formatNumber(value, decimals(metric)), unit), aside };
  });
}
