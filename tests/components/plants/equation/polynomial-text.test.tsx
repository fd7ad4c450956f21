import { describe, expect, it } from 'vitest';
import { polynomialText } from '@/components/plants/equation/polynomial-text';

describe('a polynomial is printed as it is read', () => {
  it.each([
    [[2.1], '2.1'],
    [[0.35, 1, 0], '0.35 s² + s'],
    [[-1, 0, 2], '−s² + 2'],
    [[1, -0.5], 's − 0.5'],
    [[1, ...Array<number>(12).fill(0)], 's¹²'],
    [[0, 0], '0'],
  ])('%j', (coefficients, text) => {
    expect(polynomialText(coefficients)).toBe(text);
  });
});
