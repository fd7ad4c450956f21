import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel } from '@/analysis/loop/model';
import type { Responses, TimeResponse, TimeSeries, Warning } from '@/contract';
import { drawnTimes } from './drawn-times';
import { finalValues } from './final-values';
import { isRealisable, linearLoop, openLoopPoles } from './linear-loop';
import { loadMetrics, referenceMetrics, type StepResponse } from './metrics';
import { stepResponses, type StepResponses } from './step-response';

/** What the frequency side knows of the closed loop; poles are null where dead time makes them infinite in number. */
export interface KnownStability {
  readonly stable: boolean;
  readonly closedLoopPoles: readonly Complex[] | null;
}

export interface TimeResponseOptions {
  /** The least number of points of each curve; 1,000 unless a coarser picture is enough. */
  readonly points?: number;
}

const POINTS = 1001;

const warnings = {
  improper: {
    code: 'improperController',
    message: 'The derivative is not filtered (Tf = 0), so a step would ask for an infinite command: time responses are not given.',
  },
  algebraic: {
    code: 'algebraicLoop',
    message: 'Plant and controller answer at once and their gains cancel (L(∞) = −1), so the loop has no solution in time.',
  },
  long: {
    code: 'responseTooLong',
    message: 'The response takes too long against its fastest motion or its dead time to be computed here: time responses are not given.',
  },
  boundless: {
    code: 'responseUnbounded',
    message: 'The response grows beyond all numbers within the time asked for: ask for a shorter one.',
  },
} satisfies Record<string, Warning>;

/** The two step responses as curves that can be evaluated at any time, or the warning that says why there are none. */
export function respond(model: LoopModel, duration: number | null, stability: KnownStability): StepResponses | Warning {
  if (!isRealisable(model)) return warnings.improper;
  const system = linearLoop(model);
  if (!system) return warnings.algebraic;
  const steps = stepResponses({
    model,
    system,
    poles: (system.deadTime > 0 ? null : stability.closedLoopPoles) ?? openLoopPoles(model),
    stable: stability.stable,
    duration,
    finalValues: finalValues(model),
  });
  return typeof steps === 'string' ? warnings[steps] : steps;
}

/**
 * Reference and load step of a continuous loop, with control and metrics, as numerics.md defines them.
 *
 * Exact up to rounding without dead time and to about 1e-8 of the peak with it. `timeResponse` is null, and a warning
 * says why, for an improper controller, an unsolvable algebraic loop and a response beyond the budget of work.
 *
 * @see REFERENCES.md, section "Time responses"
 */
export function timeResponse(
  model: LoopModel,
  responses: Responses,
  stability: KnownStability,
  { points }: TimeResponseOptions = {},
): { timeResponse: TimeResponse | null; warnings: Warning[] } {
  const steps = respond(model, responses.duration, stability);
  if ('code' in steps) return { timeResponse: null, warnings: [steps] };
  return { timeResponse: shown(steps, responses, { stable: stability.stable, points }), warnings: [] };
}

/** Responses to unit steps as what is shown of steps of these sizes; without metrics where the loop is unstable. */
export function shown(
  { reference, load }: StepResponses,
  { referenceStep, loadStep }: Responses,
  { stable, points = POINTS }: TimeResponseOptions & { readonly stable: boolean },
): TimeResponse {
  return {
    reference: drawn(reference, referenceStep, points),
    load: drawn(load, loadStep, points),
    metrics: stable ? { ...referenceMetrics(reference, referenceStep), ...loadMetrics(load, loadStep) } : null,
  };
}

function drawn({ output, control, axisEnd }: StepResponse, size: number, points: number): TimeSeries {
  const time = drawnTimes([output, control], axisEnd, points);
  return { time, output: output.valuesAt(time, size), control: control.valuesAt(time, size) };
}
