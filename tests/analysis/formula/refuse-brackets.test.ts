import { describe, expect, it } from 'vitest';
import { readFormula } from '@/analysis/formula/read-formula';

describe('a bracket without a partner', () => {
  it.each([
    ['2.1 exp(-0.08 s)/(s (0.35 s + 1)', 'A bracket is open at character 18. Close it, or take it out.'],
    ['(1', 'A bracket is open at character 1. Close it, or take it out.'],
    ['1/(s + 1))', 'The bracket at character 10 closes nothing. Open one before it, or take it out.'],
    ['1/(s + 1))(', 'The bracket at character 10 closes nothing. Open one before it, or take it out.'],
  ])('%s is refused where it stands', (text, message) => {
    expect(() => readFormula(text, {})).toThrow(expect.objectContaining({ pointer: '/plant/text', detail: message }));
  });
});
