import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel, Rational } from '@/analysis/loop/model';

/** factor·s^power: what a function comes to as s → 0. A factor of 0 stands for a function that is zero everywhere. */
interface Leading {
  readonly factor: number;
  readonly power: number;
}

/** Where the responses to a unit reference and a unit load end; null where they grow without bound. */
export interface FinalValues {
  readonly reference: number | null;
  readonly load: number | null;
}

/** The final-value theorem on the closed loop, exact: an integrator in the loop gives 1 and 0, not a nearly. */
export function finalValues(model: LoopModel): FinalValues {
  const { gains, weights, feedforwardGain } = model;
  const plant = leadingAtZero(model.plant);
  const forward = product(plant, leadingAtZero(model.filters));
  const feedback = firstTerm(gains.ki, gains.kp, gains.kd);
  const command = firstTerm(gains.ki, gains.kp * weights.proportional + feedforwardGain, gains.kd * weights.derivative);
  const loop = product(product(forward, feedback), leadingAtZero(model.sensor));
  return { reference: closedLimit(product(forward, command), loop), load: closedLimit(plant, loop) };
}

/** Ki/s + Kp + Kd·s near s = 0: the first that is there. */
function firstTerm(ki: number, kp: number, kd: number): Leading {
  if (ki !== 0) return { factor: ki, power: -1 };
  return kp !== 0 ? { factor: kp, power: 0 } : { factor: kd, power: 1 };
}

function leadingAtZero({ gain, zeros, poles }: Rational): Leading {
  const atOrigin = (roots: readonly Complex[]) => roots.filter(({ re, im }) => re === 0 && im === 0).length;
  return { factor: (gain * constantTerm(zeros)) / constantTerm(poles), power: atOrigin(zeros) - atOrigin(poles) };
}

/** Π(−root) over the roots away from the origin. */
function constantTerm(roots: readonly Complex[]): number {
  return roots.reduce((value, { re, im }) => (im === 0 ? value * (re === 0 ? 1 : -re) : im > 0 ? value * (re * re + im * im) : value), 1);
}

function product(a: Leading, b: Leading): Leading {
  return { factor: a.factor * b.factor, power: a.power + b.power };
}

/** lim forward/(1 + loop) as s → 0. */
function closedLimit(forward: Leading, loop: Leading): number | null {
  if (forward.factor === 0) return 0;
  const denominator = loop.factor === 0 || loop.power > 0 ? { factor: 1, power: 0 } : loop;
  const closed = loop.factor !== 0 && loop.power === 0 ? { factor: 1 + loop.factor, power: 0 } : denominator;
  const power = forward.power - closed.power;
  if (power > 0) return 0;
  return power < 0 || closed.factor === 0 ? null : forward.factor / closed.factor;
}
