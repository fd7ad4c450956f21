import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { coefficients, numbersOf } from '../support/cast';

interface PublishedLoop {
  id: string;
  source: string;
  loopGain: { numerator: number[]; denominator: number[]; deadTime: number };
  /** The printed values, from memory of the named source. */
  published: Record<string, number | string>;
  computed: {
    gainCrossovers: { frequency: number; phaseMarginDegrees: number; delaySeconds?: number }[];
    phaseCrossovers: { frequency: number; gainMarginFactor: number }[];
    ms: number;
    mt: number;
  };
}

const { cases } = JSON.parse(readFileSync('tests/fixtures/published.json', 'utf8')) as { cases: PublishedLoop[] };

/** The fixture's own digits: it was computed at 30 and written with 12 or 13. */
const WRITTEN = 1e-9;
/** Its peaks were read off a fine grid, so that they may be too low, never too high; C4's by 1.6e-6 (checked by another program). */
const PEAK = 2e-6;
/** A supremum at ω = 0 or ω → ∞ it met only as far as its grid went. */
const LIMIT = 2e-5;
const relative = (got: number, want: number) => Math.abs(got - want) / Math.max(Math.abs(want), 1e-12);

/** The printed number, from memory, beside the exact one: near it, but printed with few digits and sometimes rounded on the way. */
const PRINTED = { Ms: 0.012, PM: 0.6, GM: 0.02 };

describe.each(cases)('$id, $source', ({ loopGain, published, computed }) => {
  const { numerator, denominator, deadTime } = loopGain;
  const { margins, sensitivity } = numbersOf(coefficients(numerator, denominator, deadTime));

  it('has the crossovers computed at 30 digits', () => {
    expect(margins.gainCrossovers).toHaveLength(computed.gainCrossovers.length);
    computed.gainCrossovers.forEach((want, i) => {
      expect(relative(margins.gainCrossovers[i].frequency, want.frequency)).toBeLessThan(WRITTEN);
      expect(Math.abs(margins.gainCrossovers[i].phaseMarginDegrees - want.phaseMarginDegrees)).toBeLessThan(1e-7);
    });
    const listed = computed.phaseCrossovers.filter(({ gainMarginFactor }) => deadTime === 0 || gainMarginFactor <= 1000);
    listed.forEach((want, i) => {
      expect(relative(margins.phaseCrossovers[i].frequency!, want.frequency)).toBeLessThan(WRITTEN);
      expect(relative(margins.phaseCrossovers[i].gainMarginFactor, want.gainMarginFactor)).toBeLessThan(WRITTEN);
    });
  });

  it('has the peaks computed at 30 digits', () => {
    for (const [peak, want] of [
      [sensitivity.ms, computed.ms],
      [sensitivity.mt, computed.mt],
    ] as const) {
      expect(relative(peak.value, want)).toBeLessThan(peak.frequency ? PEAK : LIMIT);
      expect(peak.value).toBeGreaterThan(want * (1 - WRITTEN));
    }
  });

  it('agrees with what is printed, from memory', () => {
    if (typeof published.Ms === 'number') expect(relative(sensitivity.ms.value, published.Ms)).toBeLessThan(PRINTED.Ms);
    if (typeof published.PM === 'number') expect(Math.abs(margins.phase!.degrees - published.PM)).toBeLessThan(PRINTED.PM);
    if (typeof published.GM === 'number') expect(relative(margins.gain!.factor, published.GM)).toBeLessThan(PRINTED.GM);
  });
});
