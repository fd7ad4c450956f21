import { describe, expect, it } from 'vitest';
import { headlineLines, headlineText } from '@/components/verdict/headline-text';
import type { Headline } from '@/contract';

const headline: Headline = {
  quantity: 'ms',
  value: 1.6304,
  verdict: 'tight',
  case: null,
  frequency: 4.84,
  limit: 1.7,
  target: 1.6,
  use: 0.3,
  unstableCases: 0,
  reason: null,
  beside: null,
  edges: [],
  capped: false,
};
const units = { frequency: 'rad/s', magnitude: 'dB' } as const;

describe('a headline in words', () => {
  it('names quantity, number, limit and frequency', () => {
    expect(headlineText(headline, units)).toEqual({
      quantity: 'Ms',
      value: '1.63',
      words: false,
      limit: 'at most 1.70',
      frequency: 'at 4.84 rad/s',
    });
  });

  it('follows the reader’s units', () => {
    expect(headlineText(headline, { ...units, frequency: 'Hz' }).frequency).toBe('at 0.77 Hz');
  });

  it('says unstable in the place of the number', () => {
    const { quantity, value, frequency } = headlineText({ ...headline, verdict: 'fail', unstableCases: 3 }, units);
    expect([quantity, value, frequency]).toEqual([null, 'unstable', null]);
  });

  it('gives the reason where there is no number', () => {
    expect(headlineText({ ...headline, verdict: 'notJudged', value: null, reason: 'Nobody stated the delay.' }, units)).toMatchObject({
      value: 'Nobody stated the delay.',
      words: true,
    });
  });
});

describe('what stands under the headline', () => {
  const lines = (change: Partial<Headline>) => {
    const changed = { ...headline, ...change };
    return headlineLines(changed, headlineText(changed, units), 24);
  };
  const low = { axis: 'speed', end: 'low' } as const;

  it('says of how many cases it is the worst, and where', () => {
    expect(lines({})).toEqual(['worst of 24, at 4.84 rad/s']);
  });

  it('says that the case stands at the edge, and whether every such edge was declared', () => {
    expect(lines({ edges: [{ ...low, physical: true }] })[1]).toBe('at the edge of what was checked, declared');
    expect(
      lines({
        edges: [
          { ...low, physical: true },
          { axis: 'mass', end: 'low', physical: false },
        ],
      })[1],
    ).toBe('at the edge of what was checked');
  });

  it('says in how many cases the loop is unstable, and nothing of margins', () => {
    expect(lines({ unstableCases: 3, edges: [{ ...low, physical: false }] })).toEqual([
      'unstable in 3 of 24',
      'Margins have no meaning there.',
    ]);
  });
});
