import { describe, expect, it } from 'vitest';
import { emptyPlantForm } from '@/components/plants/plant-form';
import { fieldOf, readPlantForm } from '@/components/plants/read-plant-form';

const typed = { ...emptyPlantForm, name: 'Car', numerator: '2.1', denominator: '0.35, 1, 0', deadTime: '0,08' };

describe('the plant editor reads its fields', () => {
  it('makes the plant that was typed', () => {
    expect(readPlantForm(typed)).toEqual({
      errors: {},
      content: {
        plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
        sensor: null,
        deadTimeBasis: null,
        delayBudget: [],
        units: { input: '', output: '' },
      },
    });
  });

  it('keeps a sensor only where it does something', () => {
    expect(readPlantForm({ ...typed, sensorLag: '0.02' }).content?.sensor).toEqual({ timeConstant: 0.02, deadTime: 0 });
  });

  it.each([
    ['name', '  ', 'A name has at least one character.'],
    ['numerator', '0', 'The numerator is not zero.'],
    ['denominator', '', 'The denominator has at least one coefficient.'],
    ['denominator', '1, x', '“x” is not a number.'],
    ['deadTime', '-0.08', 'Dead time is 0 or more.'],
    ['deadTime', '20000', 'Dead time is at most 10,000 s.'],
    ['deadTime', 'NaN', 'Dead time is a number, as in 0.08.'],
  ] as const)('says at the field %s, "%s", what is wrong', (field, text, message) => {
    expect(readPlantForm({ ...typed, [field]: text }).errors).toEqual({ [field]: message });
  });

  it('refuses more coefficients than the contract takes', () => {
    const many = Array.from({ length: 26 }, () => 1).join(' ');
    expect(readPlantForm({ ...typed, denominator: many }).errors.denominator).toBe('The denominator has at most 25 coefficients.');
  });

  it('shows what the engine has against an improper plant at one of its fields', () => {
    const { content, errors } = readPlantForm({ ...typed, numerator: '1, 0, 0, 0' });
    expect(content).toBeNull();
    expect(Object.keys(errors)).toHaveLength(1);
  });

  it('finds the field that a pointer of the server means', () => {
    expect(fieldOf('/plant/denominator/2')).toBe('denominator');
    expect(fieldOf('/units/input')).toBeUndefined();
  });
});
