import { describe, expect, it } from 'vitest';
import { caseLoop } from '@/analysis/project';
import { describeFormula, resolvePlant } from '@/analysis/formula';
import { DesignContent, KeptPlant, Loop, PlantContent } from '@/contract';

const plant = PlantContent.parse({
  plant: { kind: 'coefficients', numerator: [2.1, -4], denominator: [0.35, 1, 0], deadTime: 0.08 },
  sensor: { timeConstant: 0.02 },
});
const design = DesignContent.parse({
  controller: { form: 'parallel', kp: 1.2, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
  sampling: 'continuous',
});
const sampling = { period: 0.01, integral: 'backward', derivative: 'backward', computationDelay: 0 } as const;

describe('the loop of a case', () => {
  it('is a whole Loop of plant, sensor and controller', () => {
    const loop = caseLoop({ plant, parameters: {} }, design);
    expect(Loop.parse(loop)).toEqual(loop);
    expect(loop).toMatchObject({ plant: plant.plant, sensor: plant.sensor, controller: design.controller, actuator: null });
  });

  it('multiplies the whole numerator by the gain factor and puts its dead time in place', () => {
    expect(caseLoop({ plant, parameters: { gainFactor: -0.5, deadTime: 0 } }, design).plant).toEqual({
      kind: 'coefficients',
      numerator: [-1.05, 2],
      denominator: [0.35, 1, 0],
      deadTime: 0,
    });
  });

  it('keeps the dead time of a plant in roots that only changes its gain', () => {
    const roots = PlantContent.parse({ plant: { kind: 'roots', gain: 6, poles: [{ re: -2, im: 0 }], deadTime: 0.1 } });
    expect(caseLoop({ plant: roots, parameters: { gainFactor: 2 } }, design).plant).toMatchObject({ gain: 12, deadTime: 0.1 });
  });

  it.each([
    ['a product', '2.1 exp(-0.08 s)/(s (0.35 s + 1))', 'roots'],
    ['one polynomial over another', '(s + 3)/(s^2 + 0.2 s + 7)', 'coefficients'],
  ])('runs a formula written as %s by its reading, exactly as a parser would', (_, text, kind) => {
    const entered = PlantContent.parse({ plant: { kind: 'formula', text } });
    const formula = KeptPlant.parse({ ...entered, reading: describeFormula(entered.plant) });
    const { plant: run } = caseLoop({ plant: formula, parameters: {} }, design);
    expect(run.kind).toBe(kind);
    expect(run).toEqual(resolvePlant(entered.plant));
    expect(caseLoop({ plant: formula, parameters: { deadTime: 2 } }, design).plant).toEqual({ ...run, deadTime: 2 });
  });

  it('refuses to override a formula that nobody read, whose dead time stands in its text', () => {
    const formula = PlantContent.parse({ plant: { kind: 'formula', text: 'exp(-s)/(s+1)' } });
    expect(caseLoop({ plant: formula, parameters: {} }, design).plant).toEqual(formula.plant);
    expect(() => caseLoop({ plant: formula, parameters: { deadTime: 2 } }, design)).toThrow(TypeError);
  });

  it('is not sampled where a design says continuous, and where nobody said', () => {
    expect(caseLoop({ plant, parameters: {} }, design).sampling).toBeNull();
    expect(caseLoop({ plant, parameters: {} }, { ...design, sampling: null }).sampling).toBeNull();
    expect(caseLoop({ plant, parameters: {} }, { ...design, sampling }).sampling).toEqual(sampling);
  });
});
