import { describe, expect, it } from 'vitest';
import { analyseLoop, buildLoop, LoopError } from '@/analysis';
import { respondLimited, respondSampled } from '@/analysis/sampled/sampled-responses';
import type { Loop, LoopInput } from '@/contract';
import { coefficients, loopOf, pid } from '../support/cast';
import { every } from './cast';

const PERIOD = 0.02;
const plant = coefficients([1.5], [0.4, 1, 0], 0.05);
const controller = pid(2, 0.8, 0.3, 0.05);
type Actuator = NonNullable<LoopInput['actuator']>;

const limited = (actuator: Actuator | null, rest: Partial<LoopInput> = {}): Loop =>
  loopOf(plant, controller, { ...every(PERIOD, { computationDelay: PERIOD }), actuator, ...rest });
const answer = (actuator: Actuator | null, rest: Partial<LoopInput> = {}) => analyseLoop(limited(actuator, rest));
describe('actuator limits without meaning are refused at their field', () => {
  it.each<[string, Actuator, string]>([
    ['a minimum above the maximum', { minimum: 2, maximum: 1 }, '/actuator/minimum'],
    ['an operating command above the maximum', { minimum: -1, maximum: 1, operatingCommand: 1.5 }, '/actuator/operatingCommand'],
    ['an operating command below a minimum alone', { minimum: 0, maximum: null, operatingCommand: -1 }, '/actuator/operatingCommand'],
    [
      'a tracking time below the sample period',
      { minimum: -1, maximum: 1, antiWindup: 'backCalculation', trackingTime: 0.01 },
      '/actuator/trackingTime',
    ],
  ])('%s', (_, actuator, pointer) => {
    try {
      answer(actuator);
    } catch (error) {
      expect(error).toBeInstanceOf(LoopError);
      expect((error as LoopError).pointer).toBe(pointer);
      return;
    }
    throw new Error('accepted');
  });
});

/** The same loop written down a second time: difference equation, limits and plant, in steps of a twentieth of a period. */
const integrated = ({ minimum, maximum, rate, antiWindup, trackingTime }: Actuator, size: number, duration: number): number[] => {
  const step = PERIOD / 20;
  const [deadSteps, computeSteps] = [50, 20];
  let [integral, derivative, lastSample, lastCommand] = [0, 0, 0, 0];
  let state = [0, 0];
  const outputs = [0];
  const commands: number[] = [];
  const decay = 0.05 / (0.05 + PERIOD);
  for (let now = 0; now * step < duration; now += 1) {
    if (now % 20 === 0) {
      const sample = now >= deadSteps ? outputs[now - deadSteps] : 0;
      const increment = 0.8 * PERIOD * (size - sample);
      derivative = decay * derivative - (0.3 / (0.05 + PERIOD)) * (sample - lastSample);
      const asked = 2 * (size - sample) + integral + increment + derivative;
      const moved = Math.max(lastCommand - (rate ?? Infinity) * PERIOD, Math.min(lastCommand + (rate ?? Infinity) * PERIOD, asked));
      const command = Math.max(minimum ?? -Infinity, Math.min(maximum ?? Infinity, moved));
      const holds = antiWindup === 'conditional' && (asked - command) * increment > 0;
      if (!holds) integral += increment;
      if (antiWindup === 'backCalculation') integral += (PERIOD / (trackingTime ?? Math.sqrt(0.3 / 0.8))) * (command - asked);
      [lastSample, lastCommand] = [sample, command];
      for (let k = 0; k < 20; k += 1) commands.push(command);
    }
    const u = now >= computeSteps ? commands[now - computeSteps] : 0;
    const slope = ([, v]: number[]) => [v, (1.5 * u - v) / 0.4];
    const a = slope(state);
    const b = slope(state.map((x, i) => x + 0.5 * step * a[i]));
    const c = slope(state.map((x, i) => x + 0.5 * step * b[i]));
    const d = slope(state.map((x, i) => x + step * c[i]));
    state = state.map((x, i) => x + (step / 6) * (a[i] + 2 * b[i] + 2 * c[i] + d[i]));
    outputs.push(state[0]);
  }
  return outputs.map((_, now) => (now >= deadSteps ? outputs[now - deadSteps] : 0));
};

describe('a large step within limits', () => {
  const narrow = { minimum: -1, maximum: 1.2 };
  const size = 3;
  const duration = 12;

  it.each<[string, Actuator]>([
    ['without anti-windup', { ...narrow, antiWindup: 'none' }],
    ['with conditional integration', { ...narrow, antiWindup: 'conditional' }],
    ['with back-calculation over 0.5 s', { ...narrow, antiWindup: 'backCalculation', trackingTime: 0.5 }],
    ['with back-calculation over the usual time', { ...narrow, antiWindup: 'backCalculation' }],
    ['with a rate limit alone', { minimum: null, maximum: null, rate: 2, antiWindup: 'none' }],
    ['with both', { ...narrow, rate: 4, antiWindup: 'conditional' }],
  ])('%s is what an integration in fine steps gives', (_, actuator) => {
    const model = buildLoop(limited(actuator));
    const linear = respondSampled(model, model.sampled!, { stable: true, duration });
    if (typeof linear === 'string') throw new Error(linear);
    const sizes = { reference: size, load: 0 };
    const found = respondLimited(model, model.sampled!, { sizes, linear, stable: true, duration });
    if (typeof found === 'string') throw new Error(found);
    const want = integrated(actuator, size, duration);
    const peak = Math.max(...want);
    for (let t = 0; t <= duration; t += 0.05)
      expect(Math.abs(size * found.reference.output.valueAt(t) - want[Math.round((t / PERIOD) * 20)])).toBeLessThan(1e-6 * peak);
    expect(found.timeAtLimits).toBeGreaterThan(0.1);
  });

  it('keeps the command about the operating command between the limits, and its moves below the rate', () => {
    const actuator = { minimum: 0, maximum: 2, operatingCommand: 0.8, rate: 5 };
    const { reference } = answer(actuator, { responses: { duration, referenceStep: size } }).timeResponse!;
    expect(Math.max(...reference!.control)).toBeCloseTo(2 - 0.8, 12);
    expect(Math.min(...reference!.control)).toBeGreaterThanOrEqual(0 - 0.8 - 1e-12);
    const held = reference!.control.filter((u, k) => k === 0 || Math.abs(u - reference!.control[k - 1]) > 1e-9);
    held.slice(1).forEach((u, k) => expect(Math.abs(u - held[k])).toBeLessThanOrEqual(5 * PERIOD + 1e-9));
  });

  it('overshoots less the sooner the integral follows the limits', () => {
    const overshoot = (actuator: Partial<Actuator>) =>
      answer({ ...narrow, ...actuator }, { responses: { referenceStep: size } }).timeResponse!.metrics!.overshootPercent!;
    const slow = overshoot({ antiWindup: 'backCalculation', trackingTime: 20 });
    const sooner = overshoot({ antiWindup: 'backCalculation', trackingTime: 5 });
    const soonest = overshoot({ antiWindup: 'backCalculation', trackingTime: PERIOD });
    expect(overshoot({ antiWindup: 'none' })).toBeGreaterThan(slow);
    expect(slow).toBeGreaterThan(sooner);
    expect(sooner).toBeGreaterThanOrEqual(soonest);
    expect(soonest).toBeLessThan(0.5 * slow);
  });

  it('is the linear response turned into another one by its size alone', () => {
    const doubled = answer({ minimum: -2, maximum: 2.4 }, { responses: { duration, referenceStep: 2 * size } }).timeResponse!;
    const once = answer(narrow, { responses: { duration, referenceStep: size } }).timeResponse!;
    expect(doubled.metrics!.overshootPercent).toBeCloseTo(once.metrics!.overshootPercent!, 9);
    expect(doubled.metrics!.controlPeak).toBeCloseTo(2 * once.metrics!.controlPeak!, 12);
    expect(doubled.metrics!.timeAtLimits).toBe(once.metrics!.timeAtLimits);
  });
});

describe('limits that are far away', () => {
  it('change nothing', () => {
    const free = answer(null).timeResponse!;
    const far = answer({ minimum: -1e6, maximum: 1e6, rate: 1e9, antiWindup: 'backCalculation' }).timeResponse!;
    const { linear, ...rest } = far;
    expect(rest).toEqual(free);
    expect(linear).toEqual({ reference: free.reference, load: free.load });
  });

  it('leave every margin alone, near or far', () => {
    expect(answer({ minimum: -0.1, maximum: 0.1 }).margins).toEqual(answer(null).margins);
  });
});

it('a step out of the actuator’s reach never settles, and a sentence says so', () => {
  const lag = coefficients([1], [1, 1]);
  const loop = loopOf(lag, pid(2, 1), { ...every(0.05), actuator: { minimum: -0.5, maximum: 0.5, antiWindup: 'conditional' } });
  const { timeResponse, warnings } = analyseLoop(loop, { curves: false });
  expect(timeResponse!.metrics!.settlingTime).toBeNull();
  expect(warnings.map(({ code }) => code)).toEqual(['commandStaysLimited']);
});
