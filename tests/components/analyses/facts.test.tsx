import { describe, expect, it } from 'vitest';
import { closedLoopFacts, crossoverFacts, marginFacts } from '@/components/analyses/loop-facts';
import { responseFacts } from '@/components/analyses/response-facts';
import { anAnalysis } from '../../support/an-analysis';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const named = (facts: readonly { name: string }[]) => Object.fromEntries(facts.map((fact) => [fact.name, fact]));

describe('the numbers of an analysis', () => {
  it('stand with their units and where they were found', () => {
    const facts = named(marginFacts(anAnalysis(), units));
    expect(facts).toMatchObject({
      'Gain margin': { value: '21.3 dB', aside: 'at 10.87 rad/s' },
      'Phase margin': { value: '45.3°', aside: 'at 2.06 rad/s' },
      'Gain reduction': { value: '–', aside: 'no finite limit' },
      'Disk margin': { value: '0.80', aside: 'gain × 0.43 to 2.34, or ±43.7°' },
    });
  });

  it('follow the reader’s units', () => {
    const facts = named(marginFacts(anAnalysis(), { frequency: 'Hz', magnitude: 'factor' }));
    expect(facts['Gain margin']).toMatchObject({ value: '11.68', aside: 'at 1.73 Hz' });
  });

  it('list every crossover, a margin without a frequency too', () => {
    const margins = {
      gainCrossovers: [
        { frequency: 1, phaseMarginDegrees: 30 },
        { frequency: 4, phaseMarginDegrees: -20 },
      ],
      phaseCrossovers: [{ frequency: null, gainMarginFactor: 2 }],
    };
    const facts = crossoverFacts(anAnalysis({ margins }), units);
    expect(facts.map(({ name, value, aside }) => [name, value, aside])).toEqual([
      ['Gain crossover 1', '30.0°', 'at 1.00 rad/s'],
      ['Gain crossover 2', '−20.0°', 'at 4.00 rad/s'],
      ['Phase crossover 1', '6.0 dB', 'as frequency grows'],
    ]);
  });

  it('are struck out where the loop is unstable, which is said first', () => {
    const unstable = anAnalysis({ stable: false });
    const shown = [...marginFacts(unstable, units), ...crossoverFacts(unstable, units)].filter(({ value }) => value !== '–');
    expect(shown.every(({ struck }) => struck)).toBe(true);
    expect(closedLoopFacts(unstable, units)[0]).toMatchObject({ value: 'unstable', aside: '2 poles on the wrong side' });
    expect(responseFacts(unstable, { input: 'kN·m', output: 'm/s' })).toEqual([]);
  });

  it('of the responses carry the plant’s units', () => {
    const metrics = { settlingTime: 2.846, loadPeak: 0.8, loadPeakTime: 1.44, controlPeak: 0.667, iae: 1.03, overshootPercent: 0.12 };
    const facts = named(responseFacts(anAnalysis({ metrics }), { input: 'kN·m', output: 'm/s' }));
    expect(facts).toMatchObject({
      Settling: { value: '2.85 s' },
      Overshoot: { value: '0.1 %' },
      'Load peak': { value: '0.80 m/s', aside: 'after 1.44 s' },
      'Control peak': { value: '0.67 kN·m' },
      IAE: { value: '1.03 s·m/s' },
      'Rise time': { value: '–', aside: 'not reached' },
    });
  });
});
