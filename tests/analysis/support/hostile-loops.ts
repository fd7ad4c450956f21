import * as fc from 'fast-check';
import { Loop, type LoopInput } from '@/contract';

/** Ten to a power in [low, high], evenly. */
const decades = (low: number, high: number) =>
  fc.noBias(fc.integer({ min: 1000 * low, max: 1000 * high })).map((power) => 10 ** (power / 1000));
const signed = (size: fc.Arbitrary<number>) => fc.tuple(size, fc.constantFrom(1, -1)).map(([value, sign]) => value * sign);

const gain = fc.oneof(
  fc.constantFrom(0, 0, 1, -1, 1e9, -1e9, 1e-9, 1e12, 1e-12),
  signed(decades(-9, 9)),
  signed(decades(-1, 1)), // prettier-ignore
);
const time = fc.oneof(fc.constantFrom(0, 1, 1e-6, 1e6), decades(-6, 6), decades(-1, 1));
const positiveTime = time.filter((value) => value > 0);
const deadTime = fc.oneof(fc.constantFrom(0, 0, 1, 1e4, 1e-9), decades(-6, 4), decades(-2, 1));

interface Root {
  re: number;
  im: number;
}

/** One real root or a pair: left, right, on the axis or at the origin. */
const rootGroup: fc.Arbitrary<Root[]> = fc.oneof(
  fc.constant<Root[]>([{ re: 0, im: 0 }]),
  signed(decades(-5, 5)).map((re) => [{ re, im: 0 }]),
  signed(decades(-1, 1)).map((re) => [{ re, im: 0 }]),
  fc
    .record({ size: decades(-4, 4), damping: fc.constantFrom(0, 1e-12, 0.005, -0.1, 0.5, 0.99) })
    .map(({ size, damping }) => [1, -1].map((sign) => ({ re: -damping * size, im: sign * size * Math.sqrt(1 - damping * damping) }))),
);
const rootList = (most: number) =>
  fc.array(rootGroup, { maxLength: most }).map((groups) => groups.reduce((all, group) => (all.length + group.length <= most ? [...all, ...group] : all), [])); // prettier-ignore
const byRoots = fc
  .record({ gain: signed(decades(-6, 6)), poles: rootList(8), zeros: rootList(8), deadTime })
  .filter(({ poles, zeros }) => zeros.length <= poles.length)
  .map((plant) => ({ kind: 'roots' as const, ...plant }));

const coefficient = fc.oneof(fc.constantFrom(0, 1, -1), signed(decades(-6, 6)), signed(decades(-1, 1)));
const byCoefficients = fc
  .record({
    numerator: fc.array(coefficient, { minLength: 1, maxLength: 5 }),
    rest: fc.array(coefficient, { maxLength: 4 }),
    denominator: fc.array(coefficient, { minLength: 1, maxLength: 5 }),
    deadTime,
  }) // prettier-ignore
  .map(({ numerator, denominator, rest, deadTime: theta }) => ({
    kind: 'coefficients' as const,
    numerator,
    denominator: [1, ...rest, ...denominator].slice(0, 9),
    deadTime: theta,
  }))
  .filter(({ numerator, denominator }) => numerator.some((c) => c !== 0) && numerator.length <= denominator.length);

const filter = fc.oneof(
  time.map((timeConstant) => ({ kind: 'lowPass' as const, timeConstant })),
  fc.record({ kind: fc.constant('leadLag' as const), zeroTime: time, poleTime: positiveTime }),
  fc.record({ kind: fc.constant('notch' as const), frequency: decades(-4, 4), depth: fc.constantFrom(0, 0.1, 1), width: decades(-3, 2) }),
);
const shared = {
  derivativeFilterTime: time,
  setpointWeights: fc.record({ proportional: fc.constantFrom(0, 1, -1), derivative: fc.constantFrom(0, 1) }),
  feedforward: fc.record({ gain }),
  filters: fc.array(filter, { maxLength: 3 }),
};
const byTimes = { kp: gain, ti: fc.option(positiveTime), td: time, ...shared };
const controller = fc.oneof(
  fc.record({ form: fc.constant('parallel' as const), kp: gain, ki: gain, kd: gain, ...shared }),
  fc.record({ form: fc.constant('ideal' as const), ...byTimes }),
  fc.record({ form: fc.constant('series' as const), ...byTimes }),
);

/** Loops that the contract takes and nobody would draw: gains of 0 and 1e9, dead times of hours, twelve decades of time. */
export const hostileLoop: fc.Arbitrary<Loop> = fc
  .record({
    plant: fc.oneof(byRoots, byCoefficients),
    controller,
    sensor: fc.option(fc.record({ timeConstant: time.filter((value) => value <= 1e4), deadTime })),
    responses: fc.constantFrom({}, {}, { duration: 1e-6 }, { duration: 1e7 }, { duration: 10, referenceStep: 0 }),
    at: fc.constantFrom<number[][]>([], [1e-9, 1, 1e12]),
  })
  .map((loop) => Loop.parse(loop satisfies LoopInput));
