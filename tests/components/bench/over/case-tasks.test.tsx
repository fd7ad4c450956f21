import { describe, expect, it } from 'vitest';
import { contentWith, settingsOf, startSettings } from '@/components/bench/draft/settings';
import { judge, lookAlong, marks } from '@/components/bench/engine/case-tasks';
import { casesQuestion, MOST_MOVING, nearestFirst } from '@/components/bench/over/cases-question';
import { type Conditions, type FrozenCase, PlantContent } from '@/contract';

const content = PlantContent.parse({
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  deadTimeBasis: 'measured',
  units: { input: 'kN·m', output: 'm/s' },
});
const plant = { ...content, id: 'plant', name: 'Speed', revision: 1 };
const aCase = (id: string, gainFactor: number): FrozenCase => ({
  id,
  name: id,
  plant,
  parameters: { gainFactor },
  axes: {},
  basis: 'figures',
});
const ms = { quantity: 'ms', bound: 'max', limit: 1.7, target: null, source: '' } as const;
const conditions: Conditions = { cases: [aCase('heavy', 0.8), aCase('light', 1.2)], limits: [ms], operatingRange: [] };
const settings = { ...startSettings, kp: 0.4, statedContinuous: true };
const design = contentWith(null, settings);
const judged = judge({ design, conditions, cases: conditions.cases, detail: 'full' });

describe('a design over all cases', () => {
  it('is judged case by case and together', () => {
    expect(judged.results.map((result) => result.case.id)).toEqual(['heavy', 'light']);
    expect(judged.headline).toMatchObject({ quantity: 'ms', case: { id: 'light' }, limit: 1.7 });
  });

  it('has a thin curve of every case', () => {
    expect(judged.curves.map(({ loop, plant }) => [loop.real.length > 100, plant.magnitude.length])).toEqual([
      [true, 0],
      [true, 0],
    ]);
  });

  it('is told by its numbers alone while a gain moves, with the same headline', () => {
    const moving = judge({ design, conditions, cases: conditions.cases, detail: 'live' });
    expect(moving.curves).toEqual([]);
    expect(moving.headline.value).toBeCloseTo(judged.headline.value ?? NaN, 8);
  });

  it('has room until the first limit breaks, which is where its mark stands too', () => {
    const room = lookAlong({ way: 'moreGain', design, conditions, results: judged.results });
    const { limit } = marks({ opened: null, settings, gain: 'kp', side: 'up', cases: conditions.cases, limits: [ms] });
    expect(room.any).toMatchObject({ quantity: 'ms', case: { id: 'light' } });
    expect(limit).toMatchObject({ quantity: 'ms', case: { id: 'light' } });
    // A proportional gain is the loop's gain: rounded down, the room ends where the mark stands.
    const factor = (limit?.holds ?? NaN) / settings.kp;
    expect(factor).toBeGreaterThan(1);
    expect(factor - (room.any?.amount ?? NaN)).toBeGreaterThanOrEqual(-1e-3);
    expect(factor - (room.any?.amount ?? NaN)).toBeLessThan(0.011);
  });

  it('keeps every limit up to a mark and breaks the named one beyond it', () => {
    const { limit } = marks({ opened: null, settings, gain: 'kp', side: 'up', cases: conditions.cases, limits: [ms] });
    const verdictAt = (kp: number) => {
      const turned = judge({ design: contentWith(null, { ...settings, kp }), conditions, cases: conditions.cases, detail: 'full' });
      return turned.results.map((result) => `${result.case.id} ${result.verdict === 'fail' ? 'fails' : 'holds'}`);
    };
    expect(verdictAt(limit?.holds ?? NaN)).toEqual(['heavy holds', 'light holds']);
    expect(verdictAt(limit?.breaks ?? NaN)).toEqual(['heavy holds', 'light fails']);
  });

  it('keeps what a kept design states', () => expect(settingsOf(design).statedContinuous).toBe(true));
});

describe('what the engine is asked while a gain moves', () => {
  const many = { ...conditions, cases: Array.from({ length: 60 }, (_, n) => aCase(`case ${n}`, 0.5 + n / 100)) };
  const subject = { conditions: many, opened: null };
  const rested = judge({ design, conditions: many, cases: many.cases, detail: 'full' });

  it('is of many cases those nearest their limits, in their own order', () => {
    const { cases } = casesQuestion({ subject, settings, detail: 'live', rested });
    expect(cases.map(({ id }) => id)).toEqual(many.cases.slice(-MOST_MOVING).map(({ id }) => id));
  });

  it('is of all cases at rest', () => {
    expect(casesQuestion({ subject, settings, detail: 'full', rested }).cases).toHaveLength(60);
  });

  it('begins with what nobody judged yet', () => {
    const added = { ...many, cases: [...many.cases, aCase('new', 0.1)] };
    expect(nearestFirst(added, rested.results)[0].id).toBe('new');
  });
});
