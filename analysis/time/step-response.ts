import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel } from '@/analysis/loop/model';
import type { FinalValues } from './final-values';
import { GROWN, hasGrown, hasSettled, simulateUntil } from './horizon';
import { monotoneKnots, type Knots } from './knots';
import type { LoopSystem } from './loop-system';
import type { StepResponse } from './metrics';
import { planPanels } from './panel-plan';
import { lastOutside } from './passages';
import { isResolved } from './resolution';
import { loadBand, referenceBand } from './settling';
import { Simulation } from './simulation';
import { Tracks } from './track';

/** Panels of time that one response may cost: about a second of work. */
const MAX_PANELS = 100_000;

/** How much finer than the poles ask for panels are made, one after the other, until a response is resolved. */
const FINENESSES = [1, 2, 4, 8, 16];

/** The first look at a response reaches past its dead time by so many panels. */
const FIRST_PANELS = 4;

/** The axis is this multiple of the settling time: between the 1.25 and 2 that numerics.md allows. */
const AXIS_PER_SETTLING = 1.6;

type StepKind = 'reference' | 'load';
const bands = { reference: referenceBand, load: loadBand };

export interface StepQuestion {
  readonly model: LoopModel;
  readonly system: LoopSystem;
  readonly poles: readonly Complex[];
  readonly stable: boolean;
  readonly duration: number | null;
  readonly finalValues: FinalValues;
}

export interface StepResponses {
  readonly reference: StepResponse;
  readonly load: StepResponse;
}

/** The responses to a unit reference and a unit load step, or null where they would take more work than is allowed. */
export function stepResponses(question: StepQuestion): StepResponses | null {
  for (const fineness of FINENESSES) {
    const attempt = attemptResponses(question, fineness);
    if (attempt !== 'coarse') return attempt;
  }
  return null;
}

function attemptResponses(question: StepQuestion, fineness: number): StepResponses | 'coarse' | null {
  const { system, finalValues } = question;
  const stages = planPanels(question.poles, system.deadTime || Infinity, fineness);
  const tracks = new Tracks(system, stages);
  const firstHorizon = 2 * system.deadTime + FIRST_PANELS * stages[0].width;
  const respond = (kind: StepKind) => {
    const initial = kind === 'reference' ? system.initial(1, 0) : system.initial(0, 1);
    const simulation = new Simulation({
      system,
      tracks,
      initial,
      outputDelay: question.model.plantDeadTime,
      widening: question.stable && system.deadTime > 0,
    });
    return finish(question, { simulation, firstHorizon, kind, finalValue: finalValues[kind] });
  };
  const reference = respond('reference');
  if (typeof reference === 'string') return reference === 'coarse' ? reference : null;
  const load = respond('load');
  if (typeof load === 'string') return load === 'coarse' ? load : null;
  return { reference, load };
}

interface Run {
  readonly simulation: Simulation;
  readonly firstHorizon: number;
  readonly kind: StepKind;
  readonly finalValue: number | null;
}

function finish({ stable, duration }: StepQuestion, { simulation, firstHorizon, kind, finalValue }: Run): StepResponse | 'coarse' | 'long' {
  const { output, control } = simulation;
  const bandFor = (peak: number) => bands[kind](finalValue, peak);
  const enough = stable ? hasSettled(bandFor) : duration === null ? hasGrown : () => true;
  const watched = simulateUntil(simulation, { firstHorizon, maxPanels: MAX_PANELS, enough });
  if (watched.outcome !== 'done') return watched.outcome;
  const horizon = Math.max(watched.horizon, duration ?? 0);
  if (!simulation.advanceTo(horizon, MAX_PANELS)) return 'long';
  if (!isResolved(output) || !isResolved(control)) return 'coarse';
  const knots = monotoneKnots(output, horizon);
  const shown = stable ? AXIS_PER_SETTLING * (lastOutside(output, knots, bandFor(output.size)) ?? 0) || horizon : grownAt(knots) || horizon;
  return { output, control, knots, horizon, axisEnd: duration ?? shown, finalValue };
}

/** When the response first reached ten times the unit step; 0 if it never did. */
function grownAt({ times, values }: Knots): number {
  return times[values.findIndex((value) => Math.abs(value) >= GROWN)] ?? 0;
}
