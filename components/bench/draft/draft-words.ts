import { formatGain } from '@/figures/format';
import { writtenIn } from './form';
import { type Gain, gains, gainWords } from './gain';
import { sameFilters, type Settings } from './settings';

const weights = { proportionalWeight: 'Weight b', derivativeWeight: 'Weight c', feedforward: 'Feedforward' } as const;

const printed = (value: number | null): string => (value === null ? 'none' : formatGain(value));

interface Change {
  readonly label: string;
  /** Of a number: from what to what. */
  readonly step?: string;
}

function gainChanges(from: Settings, to: Settings): Change[] {
  if (from.form !== to.form) return [{ label: 'Form', step: `${from.form} to ${to.form}` }, ...otherGains(from, to)];
  return gains
    .filter((gain) => from[gain] !== to[gain])
    .map((gain) => ({ label: gainWords(gain, to.form).label, step: `${printed(from[gain])} to ${printed(to[gain])}` }));
}

/** A step that changes the form changes nothing else, unless the whole controller was taken from another revision. */
function otherGains(from: Settings, to: Settings): Change[] {
  const written = writtenIn(to.form, from);
  const differs = (gain: Gain) => 'refusal' in written || printed(written.gains[gain]) !== printed(to[gain]);
  return gains.filter(differs).map((gain) => ({ label: gainWords(gain, to.form).label }));
}

function changes(from: Settings, to: Settings): Change[] {
  const shared = (Object.keys(weights) as (keyof typeof weights)[])
    .filter((field) => from[field] !== to[field])
    .map((field) => ({ label: weights[field], step: `${printed(from[field])} to ${printed(to[field])}` }));
  const filters = sameFilters(from.filters, to.filters) ? [] : [{ label: 'Filters' }];
  return [...gainChanges(from, to), ...shared, ...filters];
}

/**
 * What a step from one place to another changes, for the button that takes it.
 * @example changeWords(now, before) // "Kp 1.05 to 1.00"
 */
export function changeWords(from: Settings, to: Settings): string {
  const found = changes(from, to);
  if (found.length === 0) return from.statedContinuous === to.statedContinuous ? '' : 'what is stated about sampling';
  const [only] = found;
  return found.length === 1 && only.step ? `${only.label} ${only.step}` : found.map(({ label }) => label).join(', ');
}
