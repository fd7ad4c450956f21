import { describe, expect, it } from 'vitest';
import { parseCoefficients } from '@/components/plants/notation/parse-coefficients';

describe('coefficients are read as people write them', () => {
  it.each([
    ['2.1', [2.1]],
    ['0.35, 1.00672, 0.0192', [0.35, 1.00672, 0.0192]],
    ['0.35,1,0', [0.35, 1, 0]],
    ['0.35 1 0', [0.35, 1, 0]],
    ['0,35 1 0', [0.35, 1, 0]],
    ['0,35; 1; 0', [0.35, 1, 0]],
    ['−1, 2e-3', [-1, 0.002]],
  ])('%s', (text, numbers) => {
    expect(parseCoefficients(text)).toEqual({ numbers });
  });

  it('names the piece that is no number', () => {
    expect(parseCoefficients('1, two, 3')).toEqual({ wrong: 'two' });
  });

  it('says where a coefficient is missing', () => {
    expect(parseCoefficients('1,,3')).toEqual({ wrong: '' });
  });
});
