import { formatGain } from '@/figures/format';
import type { Settings } from './settings';

const labels: Readonly<Record<Exclude<keyof Settings, 'statedContinuous'>, string>> = {
  kp: 'Kp',
  ki: 'Ki',
  kd: 'Kd',
  filterTime: 'Tf',
  proportionalWeight: 'Weight b',
  derivativeWeight: 'Weight c',
  feedforward: 'Feedforward',
};

/**
 * What a step from one place to another changes, for the button that takes it.
 * @example changeWords(now, before) // "Kp 1.05 to 1.00"
 */
export function changeWords(from: Settings, to: Settings): string {
  const changed = (Object.keys(labels) as (keyof typeof labels)[]).filter((field) => from[field] !== to[field]);
  if (changed.length === 1) return `${labels[changed[0]]} ${formatGain(from[changed[0]])} to ${formatGain(to[changed[0]])}`;
  if (changed.length > 1) return changed.map((field) => labels[field]).join(', ');
  return from.statedContinuous === to.statedContinuous ? '' : 'what is stated about sampling';
}
