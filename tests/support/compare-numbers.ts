import type { Analysis } from '@/contract';
import { Misses } from './misses';
import type { ReferenceLoop } from './reference-loop';

/** How far numbers may be from the reference, which gives 12 digits; the tolerances of numerics.md. A peak is flat, so its place is known less well than its height. */
const frequency = { relative: 1e-6, absolute: 1e-9 };
const factor = { relative: 1e-6 };
const degrees = { absolute: 1e-5 };
const placeOfPeak = { relative: 1e-4, absolute: 1e-9 };
const bandwidth = { relative: 1e-5 };

type Expected = ReferenceLoop['expect'];

function compareCrossovers(misses: Misses, { margins }: Analysis, expected: Expected): void {
  misses.compare('gain crossovers', margins.gainCrossovers.length, expected.gainCrossovers.length);
  misses.compare('phase crossovers', margins.phaseCrossovers.length, expected.phaseCrossovers.length);
  expected.gainCrossovers.forEach((wanted, i) => {
    const got = margins.gainCrossovers[i];
    misses.compare(`gainCrossovers[${i}].frequency`, got?.frequency, wanted.frequency, frequency);
    misses.compare(`gainCrossovers[${i}].phaseMarginDegrees`, got?.phaseMarginDegrees, wanted.phaseMarginDegrees, degrees);
  });
  expected.phaseCrossovers.forEach((wanted, i) => {
    const got = margins.phaseCrossovers[i];
    misses.compare(`phaseCrossovers[${i}].frequency`, got?.frequency, wanted.frequency, frequency);
    misses.compare(`phaseCrossovers[${i}].gainMarginFactor`, got?.gainMarginFactor, wanted.gainMarginFactor, factor);
  });
}

function compareMargins(misses: Misses, { margins }: Analysis, expected: Expected): void {
  for (const key of ['gain', 'gainReduction'] as const) {
    const decibels = expected[key] && 20 * Math.log10(expected[key].factor);
    misses.compare(`${key}.factor`, margins[key]?.factor, expected[key]?.factor, factor);
    misses.compare(`${key}.decibels`, margins[key]?.decibels, decibels, { absolute: 1e-4 });
    misses.compare(`${key}.frequency`, margins[key]?.frequency, expected[key]?.frequency, frequency);
  }
  misses.compare('phase.degrees', margins.phase?.degrees, expected.phase?.degrees, degrees);
  misses.compare('phase.frequency', margins.phase?.frequency, expected.phase?.frequency, frequency);
  misses.compare('delay.seconds', margins.delay?.seconds, expected.delay?.seconds, factor);
  misses.compare('disk.alpha', margins.disk.alpha, expected.disk.alpha, factor);
  misses.compare('modulus', margins.modulus, 1 / expected.ms.value, factor);
}

/** Everything that is a number in an analysis of a reference loop: what disagrees, one line each. */
export function compareNumbers(analysis: Analysis, expected: Expected): string[] {
  const misses = new Misses();
  misses.unless(analysis.closedLoop.stable === expected.stable, `stable: got ${analysis.closedLoop.stable}`);
  misses.compare('unstablePoles', analysis.closedLoop.unstablePoles, expected.unstablePoles);
  compareCrossovers(misses, analysis, expected);
  compareMargins(misses, analysis, expected);
  for (const key of ['ms', 'mt'] as const) {
    misses.compare(key, analysis.sensitivity[key].value, expected[key].value, factor);
    misses.compare(`${key}.frequency`, analysis.sensitivity[key].frequency, expected[key].frequency, placeOfPeak);
  }
  for (const key of ['closedLoop', 'sensitivity'] as const)
    misses.compare(`bandwidth.${key}`, analysis.bandwidth[key], expected.bandwidth[key], bandwidth);
  return misses.lines;
}
