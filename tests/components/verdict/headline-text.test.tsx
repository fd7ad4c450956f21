import { describe, expect, it } from 'vitest';
import { headlineText } from '@/components/verdict/headline-text';
import type { Headline } from '@/contract';

const headline: Headline = {
  quantity: 'ms',
  value: 1.6304,
  verdict: 'tight',
  case: null,
  frequency: 4.84,
  limit: 1.7,
  use: 0.3,
  unstableCases: 0,
  reason: null,
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
