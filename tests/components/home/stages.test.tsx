import { describe, expect, it } from 'vitest';
import { stages } from '@/components/home/stages';

const now = new Date('2026-05-15T20:00:00Z');

describe('the stages of a project', () => {
  it('say nothing that is not there', () => {
    const list = stages({ plants: [], cases: [], designs: [], limits: [], analysedAt: null, now });
    expect(list.filter(({ done }) => done)).toEqual([]);
    expect(list.map(({ state }) => state)).toEqual([
      'not entered',
      'no cases, no limits',
      'no gains kept',
      'nothing analysed',
      'nobody reviewed it',
      'nothing recorded',
    ]);
  });

  it('count an analysis only once there is one', () => {
    const list = stages({ plants: [], cases: [], designs: [], limits: [], analysedAt: '2026-05-15T18:52:00Z', now });
    expect(list.filter(({ done }) => done).map(({ name }) => name)).toEqual(['Analysis']);
  });
});
