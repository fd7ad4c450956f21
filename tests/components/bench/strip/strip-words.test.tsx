import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import { contentWith, startSettings, type Settings } from '@/components/bench/draft/settings';
import { judge } from '@/components/bench/engine/case-tasks';
import { benchLoop } from '@/components/bench/live/bench-loop';
import { budgetWords, samplingWords } from '@/components/bench/strip/budget-words';
import { marginNumbers } from '@/components/verdict/margin-numbers';
import { spokenHeadline } from '@/components/bench/strip/strip-words';
import type { BenchSubject } from '@/components/bench/subject/bench-subject';
import { type Conditions, type Filter, type FrozenCase, type Loop, PlantContent } from '@/contract';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const content = PlantContent.parse({
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  deadTimeBasis: 'measured',
});
const plant = { ...content, id: 'plant', name: 'Speed', revision: 1 };
const nominal: FrozenCase = { id: 'nominal', name: 'nominal', parameters: {}, axes: {}, basis: 'figures', plant };
const conditions: Conditions = { cases: [nominal], limits: [], operatingRange: [] };
const subject = { plant, shownCase: nominal, conditions, opened: null } as unknown as BenchSubject;

/** The loop whose numbers api.md prints. */
const settings: Settings = { ...startSettings, kp: 1.2, integral: 0.4, derivative: 0.1, filterTime: 0.02, statedContinuous: true };

function strip(changes: Partial<Settings> = {}) {
  const moved = { ...settings, ...changes };
  const loop: Loop = benchLoop(subject, moved, { reference: 1, load: 1 });
  const { conditions } = subject;
  const { headline } = judge({ design: contentWith(null, moved), conditions, cases: conditions.cases, detail: 'full' });
  return { loop, analysis: analyseLoop(loop), headline, spoken: spokenHeadline(headline, units) };
}

describe('the strip', () => {
  it('without limits says Ms, not judged, with the reason', () => {
    const { headline, spoken } = strip();
    expect(headline).toMatchObject({ verdict: 'notJudged', reason: 'No limits are set.' });
    expect(spoken).toBe('Ms 1.56, not judged, nominal.');
  });

  it('says that nobody stated the sampling', () =>
    expect(strip({ statedContinuous: false }).headline.reason).toContain('Nobody stated the sample time.'));

  it('prints Ms and the margins with their places, as the API example has them', () => {
    const printed = marginNumbers(strip().analysis, units).map(({ name, value, place }) => [name, value, place]);
    expect(printed).toEqual([
      ['Ms', '1.56', 'at 2.92 rad/s'],
      ['Phase margin', '45.3°', 'at 2.06 rad/s'],
      ['Gain margin', '21.3 dB', 'at 10.87 rad/s'],
      ['Delay margin', '0.38 s', 'at 2.06 rad/s'],
    ]);
  });

  it('of an unstable loop has the word in the place of the number', () => {
    const { headline, spoken } = strip({ kp: 40 });
    expect(headline.verdict).toBe('fail');
    expect(spoken).toBe('unstable, fail, nominal.');
  });

  it('calls a margin that does not exist "no limit"', () => {
    const { analysis } = strip();
    const open = { ...analysis, margins: { ...analysis.margins, gain: null } };
    expect(marginNumbers(open, units)[2]).toMatchObject({ value: 'no limit', place: '' });
  });
});

describe('the delay budget', () => {
  // 2.0590 rad/s · 0.08 s = 0.16472 rad = 9.4°.
  it('says what the dead time costs at the crossover', () => {
    const { loop, analysis } = strip();
    expect(budgetWords(loop, analysis, units)).toEqual({ lead: 'Phase at crossover 2.06 rad/s:', text: 'dead time 9.4°' });
  });

  // The low-pass turns by −45° where 1/T is the crossover; a lead-lag with the longer zero leads.
  it('names the sensor and the filters, and calls lead what it is', () => {
    const { loop, analysis } = strip();
    const crossover = analysis.margins.phase!.frequency;
    const filters: Filter[] = [
      { kind: 'leadLag', zeroTime: 1 / crossover, poleTime: 1e-9 },
      { kind: 'lowPass', timeConstant: 1 / crossover },
      { kind: 'lowPass', timeConstant: 1 / crossover },
    ];
    const filtered = { ...loop, controller: { ...loop.controller, filters }, sensor: { timeConstant: 1 / crossover, deadTime: 0 } };
    expect(budgetWords(filtered, analysis, units)?.text).toBe('dead time 9.4°, sensor lag 45.0°, low-pass 90.0°, lead-lag 45.0° lead');
  });

  it('says how the loop is sampled', () => {
    expect(samplingWords(true, null)).toBe('continuous, as stated');
    expect(samplingWords(false, null)).toBe('nobody said how it is sampled');
    expect(samplingWords(false, 0.01)).toBe('sampled, 10 ms');
  });
});
