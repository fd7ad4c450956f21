import { describe, expect, it } from 'vitest';
import { describeRule } from '@/components/charts/describe-rule';

const slow = '30 km/h, 1,380 kg';

describe('a gain’s rule in words', () => {
  it('says how far every limit holds, which stops it and where, rounded inwards', () => {
    const stretch = { low: { value: 0.9701, name: 'Overshoot', case: slow }, high: { value: 1.1299, name: 'Ms', case: slow } };
    expect(describeRule(stretch, { below: 0.13, above: 3.4 })).toBe(
      `Every limit holds from 0.971 (Overshoot, ${slow}) to 1.12 (Ms, ${slow}). Some case is unstable below 0.13 and from 3.40.`,
    );
  });

  it('rounds a negative gain inwards too', () => {
    expect(describeRule({ low: { value: -2.3456, name: 'Ms', case: slow } })).toContain('from −2.34 ');
  });

  it('says that nothing stopped it', () => expect(describeRule({})).toBe('Every limit holds as far as was looked.'));

  it('says nothing where nobody looked', () => expect(describeRule(undefined)).toBe(''));
});
