import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import type { LoopInput } from '@/contract';
import { coefficients, loopOf, pid } from './support/cast';

const off = pid(0);
const at = ({ time, output }: { time: number[]; output: number[] }, t: number): number => {
  const k = time.findIndex((later) => later >= t);
  return output[k - 1] + ((output[k] - output[k - 1]) * (t - time[k - 1])) / (time[k] - time[k - 1]);
};
const analysed = (plant: LoopInput['plant'], controller: LoopInput['controller'] = off) => analyseLoop(loopOf(plant, controller));

describe.each([0, 1])('a controller with all gains 0 before a lag with %d s of dead time', (deadTime) => {
  const { closedLoop, margins, sensitivity, timeResponse, warnings } = analysed(coefficients([2], [1, 1], deadTime));

  it('closes no loop: stable with the pole of the lag, Ms 1, no margins', () => {
    expect(closedLoop).toMatchObject({ stable: true, unstablePoles: 0, poles: [{ re: -1, im: 0 }] });
    expect(margins).toMatchObject({ gain: null, gainReduction: null, phase: null, delay: null, gainCrossovers: [], phaseCrossovers: [] });
    expect(sensitivity.ms.value).toBe(1);
    expect(sensitivity.mt.value).toBe(0);
    expect(warnings).toEqual([]);
  });

  it('answers a reference with nothing, over the axis of the load', () => {
    const { reference, load, metrics } = timeResponse!;
    expect(reference!.output.every((y) => y === 0)).toBe(true);
    expect(reference!.control.every((u) => u === 0)).toBe(true);
    expect(reference!.time.at(-1)).toBe(load!.time.at(-1));
    expect(metrics).toMatchObject({ finalValue: 0, steadyStateError: 1, riseTime: null, settlingTime: null, controlPeak: 0 });
  });

  it('answers a load as the lag alone does', () => {
    const { load, metrics } = timeResponse!;
    for (const t of [0.5, 1.5, 4]) expect(at(load!, t)).toBeCloseTo(2 * (1 - Math.exp(-Math.max(t - deadTime, 0))), 3);
    expect(metrics!.loadPeak).toBeCloseTo(2, 3);
    expect(metrics!.loadSettlingTime).toBeNull();
  });
});

describe('without feedback', () => {
  it('feedforward alone drives the plant: y ends at its gain times P(0)', () => {
    const { timeResponse } = analysed(coefficients([1], [1, 1], 1), { ...off, feedforward: { gain: 2 } });
    expect(timeResponse!.metrics!.finalValue).toBe(2);
    expect(timeResponse!.metrics!.riseTime).toBeCloseTo(Math.log(9), 9);
    expect(timeResponse!.metrics!.settlingTime).toBeCloseTo(1 + Math.log(50), 9);
  });

  it.each([0, 1])('an integrating plant is on the boundary, and its load response is shown growing (dead time %d)', (deadTime) => {
    const { closedLoop, timeResponse, warnings } = analysed(coefficients([1], [1, 0], deadTime));
    expect(closedLoop).toMatchObject({ stable: false, unstablePoles: 1 });
    expect(warnings.map(({ code }) => code)).toEqual(['onBoundary']);
    expect(timeResponse!.metrics).toBeNull();
    expect(at(timeResponse!.load!, deadTime + 3)).toBeCloseTo(3, 6);
    expect(timeResponse!.reference!.output.every((y) => y === 0)).toBe(true);
  });

  it.each([0, 1])('an unstable plant stays unstable (dead time %d)', (deadTime) => {
    const { closedLoop, timeResponse } = analysed(coefficients([1], [1, -1], deadTime));
    expect(closedLoop).toMatchObject({ stable: false, unstablePoles: 1, encirclements: 0, encirclementsNeeded: -1 });
    expect(Math.abs(timeResponse!.load!.output.at(-1)!)).toBeCloseTo(10, 1);
  });
});

describe('with feedback that a reference does not reach', () => {
  it('a proportional gain with set-point weight 0 answers the load alone', () => {
    const { timeResponse } = analysed(coefficients([1], [1, 1], 1), { ...pid(1), setpointWeights: { proportional: 0 } });
    expect(timeResponse!.metrics).toMatchObject({ finalValue: 0, steadyStateError: 1 });
    expect(timeResponse!.metrics!.loadPeak).toBeGreaterThan(0.5);
  });

  it('an unstable mode that no step wakes leaves a response that rests', () => {
    const { closedLoop, timeResponse, warnings } = analysed(coefficients([1], [1, 0]), pid(0, 0, 1, 0.5));
    expect(closedLoop.stable).toBe(false);
    expect(warnings.map(({ code }) => code)).toContain('hiddenMode');
    expect(timeResponse!.reference!.output.every((y) => Math.abs(y) < 2)).toBe(true);
  });
});

describe('a gain of 1e-9', () => {
  it.each([
    ['on a lag', coefficients([1], [1, 1], 1), pid(1e-9), 4.912],
    ['on an integrator', coefficients([1], [1, 0], 1), pid(1e-9), 3.912e9],
    ['as integral action', coefficients([1], [1, 1], 1), pid(0, 1e-9), 3.912e9],
  ])('%s settles in its own time', (_, plant, controller, settling) => {
    expect(analysed(plant, controller).timeResponse!.metrics!.settlingTime! / settling).toBeCloseTo(1, 3);
  });
});
