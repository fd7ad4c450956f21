import { describe, expect, it } from 'vitest';
import { analyseLoop, buildLoop, LoopError, toParallelGains } from '@/analysis';
import { Loop, type LoopInput } from '@/contract';
import { coefficients, loopOf, pid, roots } from '../support/cast';

const errorOf = (loop: LoopInput): { pointer: string; code: string } => {
  try {
    analyseLoop(Loop.parse(loop));
  } catch (error) {
    if (error instanceof LoopError) return { pointer: error.pointer, code: error.code };
    throw error;
  }
  throw new Error('accepted');
};

describe('a loop without meaning is refused where it was entered', () => {
  const controller = pid(1);
  it.each<[string, LoopInput, string, string]>([
    ['an improper plant', { plant: coefficients([1, 2, 3], [1, 1]), controller }, '/plant/numerator', 'improperPlant'],
    ['more zeros than poles', { plant: roots(1, { zeros: [[-1, 0]] }), controller }, '/plant/zeros', 'improperPlant'],
    ['a missing conjugate', { plant: { kind: 'roots', gain: 1, poles: [{ re: -1, im: 0 }, { re: -1, im: 2 }] }, controller }, '/plant/poles/1', 'missingConjugate'], // prettier-ignore
    ['feedthrough of −1', { plant: coefficients([-1, 1], [1, 3]), controller }, '/controller', 'singularLoop'],
    ['a formula not yet read', { plant: { kind: 'formula', text: '1/s' }, controller }, '/plant/kind', 'unsupported'],
    [
      'actuator limits',
      { plant: coefficients([1], [1, 1]), controller, actuator: { minimum: -1, maximum: 1 } },
      '/actuator',
      'unsupported',
    ],
    ['numbers too far apart', { plant: coefficients([1], Array.from({ length: 25 }, (_, i) => (i % 2 ? 1e30 : 1e-30))), controller }, '/plant', 'outOfRange'], // prettier-ignore
  ])('%s', (_, loop, pointer, code) => expect(errorOf(loop)).toEqual({ pointer, code }));
});

describe('controller forms become parallel gains exactly', () => {
  const gainsOf = (controller: LoopInput['controller']) => toParallelGains(loopOf(coefficients([1], [1, 1]), controller).controller);

  it('ideal', () => {
    expect(gainsOf({ form: 'ideal', kp: 2, ti: 4, td: 0.5, derivativeFilterTime: 0.1 })).toEqual({
      kp: 2,
      ki: 0.5,
      kd: 1,
      filterTime: 0.1,
    });
    expect(gainsOf({ form: 'ideal', kp: 2, ti: null })).toEqual({ kp: 2, ki: 0, kd: 0, filterTime: 0 });
  });

  it('series, where the filter of a PI acts on the whole of it', () => {
    expect(gainsOf({ form: 'series', kp: 2, ti: 1, td: 0.25 })).toEqual({ kp: 2.5, ki: 2, kd: 0.5, filterTime: 0 });
    expect(gainsOf({ form: 'series', kp: 1, ti: 4, td: 0, derivativeFilterTime: 0.5 })).toEqual({
      kp: 0.875,
      ki: 0.25,
      kd: -0.4375,
      filterTime: 0.5,
    });
  });

  it('and says so where a converted gain is negative', () => {
    const controller: LoopInput['controller'] = { form: 'series', kp: 1, ti: 4, td: 0, derivativeFilterTime: 0.5 };
    const { warnings } = analyseLoop(loopOf(coefficients([1], [2, 1]), controller), { curves: false });
    expect(warnings.map(({ code }) => code)).toContain('negativeConvertedGain');
  });
});

describe('the parts of a loop', () => {
  it('ignores Tf without derivative action and has no pole at the origin without integral action', () => {
    expect(buildLoop(loopOf(coefficients([1], [1, 1]), pid(3, 0, 0, 0.5))).controller.poles).toEqual([]);
    expect(buildLoop(loopOf(coefficients([1], [1, 1]), pid(3, 2, 0, 0.5))).controller.poles).toEqual([{ re: 0, im: 0 }]);
  });

  it('gives a notch its depth at the centre and 1 far away', () => {
    const controller: LoopInput['controller'] = { ...pid(1), filters: [{ kind: 'notch', frequency: 10, depth: 0.1, width: 0.4 }] };
    const { at } = analyseLoop(loopOf(coefficients([1], [1]), controller, { at: [1e-3, 10, 1e6] }), { curves: false });
    [1, 0.1, 1].forEach((want, i) => expect(Math.hypot(at[i].re, at[i].im)).toBeCloseTo(want, 8));
  });

  it('adds the sensor’s lag and dead time to the loop but not to the plant’s curve', () => {
    const loop = loopOf(coefficients([1], [1]), pid(1), { sensor: { timeConstant: 0.5, deadTime: 0.2 }, at: [2] });
    const { at, frequencyResponse } = analyseLoop(loop);
    expect(at[0].phaseDegrees).toBeCloseTo(((-Math.atan(1) - 0.4) * 180) / Math.PI, 10);
    expect(frequencyResponse!.plant.phaseDegrees.every((phase) => phase === 0)).toBe(true);
  });
});
