import type { Filter } from '@/contract';
import { formatFrequency, formatGain, withUnit } from './format';
import type { FrequencyUnit } from './units';

export const filterNames: Readonly<Record<Filter['kind'], string>> = { lowPass: 'Low-pass', notch: 'Notch', leadLag: 'Lead-lag' };

/**
 * What a filter is set to, with units.
 * @example filterText({ kind: 'notch', frequency: 40, depth: 0.1, width: 0.5 }, 'rad/s') // 'at 40.00 rad/s, depth 0.10, width 0.50'
 */
export function filterText(filter: Filter, unit: FrequencyUnit): string {
  const seconds = (time: number) => withUnit(formatGain(time), 's');
  if (filter.kind === 'lowPass') return `time constant ${seconds(filter.timeConstant)}`;
  if (filter.kind === 'leadLag') return `zero ${seconds(filter.zeroTime)}, pole ${seconds(filter.poleTime)}`;
  const place = withUnit(formatFrequency(filter.frequency, unit), unit);
  return `at ${place}, depth ${formatGain(filter.depth)}, width ${formatGain(filter.width)}`;
}
