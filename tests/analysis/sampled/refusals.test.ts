import { describe, expect, it } from 'vitest';
import { analyseLoop, LoopError } from '@/analysis';
import type { LoopInput } from '@/contract';
import { coefficients, loopOf, numbersOf, pid, roots } from '../support/cast';
import { every } from './cast';

const lag = coefficients([1], [1, 1]);

describe('what a sampled loop alone refuses, at its field', () => {
  const notch = (frequency: number): LoopInput['controller'] => ({
    ...pid(1),
    filters: [
      { kind: 'lowPass', timeConstant: 0.1 },
      { kind: 'notch', frequency, depth: 0.1, width: 0.3 },
    ],
  });
  const pointerOf = (...loop: Parameters<typeof loopOf>): string => {
    try {
      analyseLoop(loopOf(...loop), { curves: false });
    } catch (error) {
      if (error instanceof LoopError) return error.pointer;
      throw error;
    }
    throw new Error('accepted');
  };

  it.each<[string, Parameters<typeof loopOf>, string]>([
    ['a notch at half the sampling frequency', [lag, notch(Math.PI / 0.1), every(0.1)], '/controller/filters/1/frequency'],
    ['a notch above it', [lag, notch(100), every(0.1)], '/controller/filters/1/frequency'],
    ['a trapezoidal derivative without filter', [lag, pid(1, 0, 1), every(0.1, { derivative: 'trapezoidal' })], '/sampling/derivative'],
    ['a dead time of a million periods', [coefficients([1], [1, 1], 1e4), pid(1), every(0.01)], '/plant/deadTime'],
    ['a sensor that answers after a million periods', [lag, pid(1), { ...every(0.001), sensor: { deadTime: 1e3 } }], '/sensor/deadTime'],
    ['a computation of a million periods', [lag, pid(1), every(0.001, { computationDelay: 1e3 })], '/sampling/computationDelay'],
    ['a plant that explodes between two samples', [roots(1, { poles: [[1000, 0]] }), pid(1), every(1)], '/sampling/period'],
    ['an answer that feeds itself', [coefficients([-1], [1]), pid(1), every(0.1)], '/controller'],
  ])('%s', (_, loop, pointer) => expect(pointerOf(...loop)).toBe(pointer));

  it('but a notch just below half the sampling frequency, and an unfiltered derivative by backward Euler', () => {
    expect(numbersOf(lag, notch(31), every(0.1)).closedLoop.stable).toBe(true);
    expect(numbersOf(lag, pid(1, 0, 0.01), every(0.1)).timeResponse).not.toBeNull();
  });
});

describe('what is said beside the numbers of a sampled loop', () => {
  const codes = (...loop: Parameters<typeof numbersOf>) => numbersOf(...loop).warnings.map(({ code }) => code);
  const swinging = roots(100, { poles: [[-0.5, 40]] }); // prettier-ignore

  it('a mode above half the sampling frequency, with where the computer sees it', () => {
    const { warnings } = numbersOf(swinging, pid(0.1), every(0.1));
    expect(warnings).toEqual([
      {
        code: 'aliasing',
        message: 'The plant swings at 40 rad/s, above half the sampling frequency (31.42 rad/s): the computer sees it at 22.83 rad/s.',
      },
    ]);
    expect(codes(swinging, pid(0.1), every(0.05))).toEqual([]);
  });

  it('a derivative that rings', () => {
    const rule = { derivative: 'trapezoidal' } as const;
    expect(codes(lag, pid(1, 0, 0.01, 0.04), every(0.1, rule))).toEqual(['ringingDerivative']);
    expect(codes(lag, pid(1, 0, 0.01, 0.06), every(0.1, rule))).toEqual([]);
  });

  it('a mode that the loop cancels, counted as unstable', () => {
    const washout = roots(1, { zeros: [[0, 0]], poles: [[-1, 0], [-2, 0]] }); // prettier-ignore
    const { closedLoop, warnings } = numbersOf(washout, pid(1, 1), every(0.1));
    expect(closedLoop).toMatchObject({ stable: false, unstablePoles: 1 });
    expect(warnings.map(({ code }) => code)).toContain('hiddenMode');
  });
});
