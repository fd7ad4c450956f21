import type { Analysis } from '@/contract';
import { Misses } from './misses';
import type { ReferenceLoop } from './reference-loop';

const LEAST_POINTS = 50;
/** The grid's own rule is 0.5 dB and 5° between neighbours; a little more for what rounding adds. */
const MOST_DECIBELS = 0.51;
const MOST_DEGREES = 5.1;

/** L where the reference asked for it, against `analysis.at` in the same order. */
export function compareSamples(analysis: Analysis, samples: NonNullable<ReferenceLoop['expect']['samples']>): string[] {
  const misses = new Misses();
  samples.forEach((wanted, i) => {
    const got = analysis.at[i];
    const distance = Math.hypot(got.re - wanted.re, got.im - wanted.im);
    misses.unless(distance <= 1e-8 * Math.hypot(wanted.re, wanted.im), `L at ${wanted.frequency}: off by ${distance}`);
    misses.compare(`arg L at ${wanted.frequency}`, got.phaseDegrees, wanted.phaseDegrees, { relative: 1e-9, absolute: 1e-5 });
  });
  return misses.lines;
}

/** Whether the drawn curves are dense enough and agree with each other. */
export function checkCurves({ frequencyResponse }: Analysis): string[] {
  const misses = new Misses();
  if (!frequencyResponse) return ['there are no curves'];
  const { frequencies, loop, sensitivity } = frequencyResponse;
  misses.unless(frequencies.length >= LEAST_POINTS, `only ${frequencies.length} points`);
  for (let k = 0; k < frequencies.length; k += 1) {
    const fromLoop = 1 / Math.hypot(1 + loop.real[k], loop.imaginary[k]);
    misses.compare(`|S| at ${frequencies[k]}`, sensitivity[k], fromLoop, { relative: 1e-6 });
    if (k === 0) continue;
    const decibels = Math.abs(20 * Math.log10(loop.magnitude[k] / loop.magnitude[k - 1]));
    const degrees = Math.abs(loop.phaseDegrees[k] - loop.phaseDegrees[k - 1]);
    misses.unless(decibels <= MOST_DECIBELS && degrees <= MOST_DEGREES, `too coarse at ${frequencies[k]}: ${decibels} dB, ${degrees}°`);
  }
  return misses.lines;
}
