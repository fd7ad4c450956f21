import { describe, expect, it } from 'vitest';
import { readNotation } from '@/components/plants/notation/read-notation';
import { sameResponse } from '@/components/plants/notation/same-response';
import { bringBack, switchNotation } from '@/components/plants/notation/switch-notation';
import type { Notation } from '@/components/plants/notation/notation';
import type { WorkedOut } from '@/components/plants/notation/write-plant';
import { emptyPlantForm, hasTyped, isChanged, type PlantForm } from '@/components/plants/plant-form';

const typed: PlantForm = { ...emptyPlantForm, name: 'Car', numerator: '2.1', denominator: '0,35 1 0', deadTime: '0.080' };

/** What the server reads the formula of these tests into. */
const formulaReads: WorkedOut = { kind: 'roots', gain: 8, zeros: [], poles: [{ re: 0, im: 0 }, { re: -4, im: 0 }], deadTime: 0.2 }; // prettier-ignore

const say = (form: PlantForm): WorkedOut | null => {
  const { plant } = readNotation(form, form.notation);
  return plant?.kind === 'formula' ? formulaReads : plant;
};
const to = (form: PlantForm, notation: Notation): PlantForm => {
  const { form: next, reason } = switchNotation(form, notation, say(form));
  expect(reason).toBeNull();
  return next;
};

describe('changing the notation', () => {
  it('writes the same plant as roots and as a formula', () => {
    const roots = to(typed, 'roots');
    expect(roots).toMatchObject({ notation: 'roots', gain: '6', zeros: '', poles: '0, -2.85714285714286', deadTime: '0.08' });
    expect(to(roots, 'formula').formula).toBe('6 exp(-0.08 s)/(s (s + 2.85714285714286))');
    expect(to(typed, 'formula').formula).toBe('2.1 exp(-0.08 s)/(0.35 s^2 + s)');
  });

  it('leaves what was typed as it was typed when nothing was changed on the way', () => {
    const there = to(to(to(typed, 'roots'), 'formula'), 'coefficients');
    expect(there).toMatchObject({ numerator: '2.1', denominator: '0,35 1 0' });
    expect(there.replaced).toEqual({});
    expect(hasTyped(there, { ...typed, deadTime: '0.08' })).toBe(false);
  });

  it('writes over what no longer says the same, and lays aside what was typed there', () => {
    const changed = { ...to(typed, 'roots'), poles: '-1 ± 2i' };
    const back = to(changed, 'coefficients');
    expect(back).toMatchObject({ numerator: '6', denominator: '1, 2, 5' });
    expect(back.replaced.coefficients).toMatchObject({ numerator: '2.1', denominator: '0,35 1 0' });
    const own = { ...back, denominator: '1 2 6' };
    const again = to({ ...to(own, 'roots'), gain: '7' }, 'coefficients');
    expect(again).toMatchObject({ numerator: '7', replaced: { coefficients: { numerator: '6', denominator: '1 2 6' } } });
    expect(bringBack(again)).toMatchObject({ numerator: '6', denominator: '1 2 6' });
    expect(bringBack(bringBack(again))).toMatchObject({ numerator: '7' });
  });

  it('lays a formula aside with the values of its parameters', () => {
    const formula = {
      ...emptyPlantForm,
      notation: 'formula' as const,
      formula: 'k exp(-T s)/(s (s + 4))',
      parameters: { k: '8', T: '0.2' },
    };
    const roots = to(formula, 'roots');
    expect(roots).toMatchObject({ gain: '8', poles: '0, -4', deadTime: '0.2' });
    expect(to(roots, 'formula').formula).toBe(formula.formula);
    const after = to({ ...roots, deadTime: '0.3' }, 'formula');
    expect(after.formula).toBe('8 exp(-0.3 s)/(s (s + 4))');
    expect(bringBack(after)).toMatchObject({ formula: formula.formula, parameters: formula.parameters });
  });

  it('does not rewrite polynomials for a dead time, which they share with the roots', () => {
    const there = to({ ...to(typed, 'roots'), deadTime: '0.2' }, 'coefficients');
    expect(there).toMatchObject({ numerator: '2.1', denominator: '0,35 1 0', deadTime: '0.2' });
  });

  it('does rewrite a formula for a dead time, which stands in its text', () => {
    const there = to({ ...to(typed, 'formula'), notation: 'coefficients' as const, deadTime: '0.2' }, 'formula');
    expect(there.formula).toBe('2.1 exp(-0.2 s)/(0.35 s^2 + s)');
  });

  it('keeps both drafts where what stands there cannot be read', () => {
    const half = { ...to(typed, 'roots'), poles: '-1 + 2i' };
    const { form, reason } = switchNotation(half, 'coefficients', say(half));
    expect(reason).toMatch(/poles and zeros cannot be read/);
    expect(form).toMatchObject({ numerator: '2.1', poles: '-1 + 2i' });
    expect(hasTyped(form, typed)).toBe(true);
    expect(isChanged(form, { ...typed, deadTime: form.deadTime })).toBe(false);
  });

  it('refuses to write as polynomials what they cannot carry', () => {
    const rung = Array<string>(5).fill('-0.0005 ± i').join(', ');
    const spread: PlantForm = { ...emptyPlantForm, notation: 'roots', gain: '1', poles: rung };
    const { form, reason } = switchNotation(spread, 'coefficients', say(spread));
    expect(reason).toMatch(/^As polynomials, rounding/);
    expect(form).toMatchObject({ notation: 'coefficients', denominator: '', poles: rung });
  });

  it.each(['0, ±3i', '±i, ±2i', '-1e-4, -1, -1e4', '-0.005 ± i, -2', '0, 0, 1 ± 2i', '-1, -1, -1'])(
    'takes the poles %s to polynomials and back',
    (poles) => {
      const written = to({ ...emptyPlantForm, notation: 'roots', gain: '3', poles }, 'coefficients');
      const back = to({ ...written, numerator: `${written.numerator} ` }, 'roots');
      expect(back.gain).toBe('3');
      expect(sameResponse(say(back)!, say({ ...back, poles })!)).toBe(true);
    },
  );

  it('shows an empty notation where nothing was typed yet', () => {
    expect(switchNotation(emptyPlantForm, 'formula', null)).toEqual({ form: { ...emptyPlantForm, notation: 'formula' }, reason: null });
  });
});
