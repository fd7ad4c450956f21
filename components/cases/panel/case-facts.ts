import { describePlant, LoopError } from '@/analysis';
import { overridePlant } from '@/analysis/project';
import type { CaseParameters, FrozenCase } from '@/contract';
import { formatGain } from '@/figures/format';

const names: Readonly<Record<string, string>> = { gainFactor: 'gain factor', deadTime: 'dead time' };

/** "gain factor 1.09, dead time 0.17 s, m 1500": what a case changes of its plant; null where it changes nothing. */
export function parameterText(parameters: CaseParameters): string | null {
  const parts = Object.entries(parameters).map(
    ([name, value]) => `${names[name] ?? name} ${formatGain(value ?? 0)}${name === 'deadTime' ? ' s' : ''}`,
  );
  return parts.length === 0 ? null : parts.join(', ');
}

/** The case's own plant in words; null where it has no meaning. */
export function plantWords({ plant, parameters }: FrozenCase): string | null {
  try {
    return describePlant(overridePlant(plant, parameters)).words;
  } catch (error) {
    if (error instanceof LoopError || error instanceof TypeError) return null;
    throw error;
  }
}
