import { Loop, type LoopInput, type Responses, type TimeResponse } from '@/contract';
import { buildLoop } from '@/analysis/loop/build-loop';
import type { LoopModel, Rational } from '@/analysis/loop/model';
import type { Complex } from '@/analysis/numbers/complex';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';
import { timeResponse, type KnownStability } from '@/analysis/time';
import type { StepResponses } from '@/analysis/time/step-response';
import { respond } from '@/analysis/time/time-response';

/** A contract Loop as the engine's model, defaults filled in. */
export const modelOf = (loop: LoopInput): LoopModel => buildLoop(Loop.parse(loop));

/** What the frequency side would say of a stable loop: the roots of numerator + denominator, in expanded form. */
export function stabilityOf(model: LoopModel): KnownStability {
  if (model.plantDeadTime + model.sensorDeadTime > 0) return { stable: true, closedLoopPoles: null };
  const blocks = [model.plant, model.filters, model.controller, model.sensor];
  const numerator = expand(blocks.flatMap((block) => block.zeros)).map((c) => c * gainOf(blocks));
  const denominator = expand(blocks.flatMap((block) => block.poles));
  const padded = [...new Array<number>(denominator.length - numerator.length).fill(0), ...numerator];
  const closedLoopPoles = polynomialRoots(denominator.map((c, k) => c + padded[k]));
  return { stable: closedLoopPoles.every(({ re }) => re < 0), closedLoopPoles };
}

const gainOf = (blocks: readonly Rational[]) => blocks.reduce((gain, block) => gain * block.gain, 1);

/** Π(s − root), descending. */
function expand(roots: readonly Complex[]): number[] {
  let polynomial = [1];
  for (const { re, im } of roots) {
    if (im < 0) continue;
    const factor = im > 0 ? [1, -2 * re, re * re + im * im] : [1, -re];
    const product = new Array<number>(polynomial.length + factor.length - 1).fill(0);
    polynomial.forEach((a, i) => factor.forEach((b, j) => (product[i + j] += a * b)));
    polynomial = product;
  }
  return polynomial;
}

/** The time response of a loop that has one. */
export function answer(loop: LoopInput, responses: Partial<Responses> = {}): TimeResponse {
  const model = modelOf(loop);
  const { timeResponse: found, warnings } = timeResponse(model, { ...unitSteps, ...responses }, stabilityOf(model));
  if (!found) throw new Error(warnings[0].message);
  return found;
}

/** The same as curves that can be evaluated at any time. */
export function curvesOf(loop: LoopInput): StepResponses {
  const model = modelOf(loop);
  const steps = respond(model, null, stabilityOf(model));
  if ('code' in steps) throw new Error(steps.message);
  return steps;
}

export const unitSteps: Responses = { duration: null, referenceStep: 1, loadStep: 1 };
