import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel } from '@/analysis/loop/model';
import { simulateUntil, untilGrown, untilSettled, settlingBand, SETTLING_BAND, type Simulated } from './horizon';
import type { LoopSystem } from './loop-system';
import type { StepResponse } from './metrics';
import { planPanels } from './panel-plan';
import { isResolved } from './resolution';
import { operatorsOf, Simulation } from './simulation';

/** Panels of time that one response may cost: about a second of work. */
const MAX_PANELS = 100_000;

/** How much finer than the poles ask for panels are made, one after the other, until a response is resolved. */
const FINENESSES = [1, 2, 4, 8, 16];

/** The first look at a response reaches past its dead time by so many panels. */
const FIRST_PANELS = 4;

export interface StepQuestion {
  readonly model: LoopModel;
  readonly system: LoopSystem;
  readonly poles: readonly Complex[];
  readonly stable: boolean;
  readonly duration: number | null;
  readonly finalValues: { readonly reference: number | null; readonly load: number | null };
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
  const operators = operatorsOf(system, stages);
  const firstHorizon = 2 * system.deadTime + FIRST_PANELS * stages[0].width;
  const respond = (kind: 'reference' | 'load') => {
    const initial = kind === 'reference' ? system.initial(1, 0) : system.initial(0, 1);
    const simulation = new Simulation(system, operators, { initial, outputDelay: question.model.plantDeadTime });
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
  readonly kind: 'reference' | 'load';
  readonly finalValue: number | null;
}

function finish({ stable, duration }: StepQuestion, { simulation, firstHorizon, kind, finalValue }: Run): StepResponse | 'coarse' | 'long' {
  const { output, control } = simulation;
  const bandOf = (peak: number) =>
    kind === 'reference' ? settlingBand(finalValue ?? 0, peak) : { centre: finalValue ?? 0, band: SETTLING_BAND * peak };
  const watched: Simulated =
    duration !== null && !stable
      ? { outcome: 'done', axisEnd: duration, horizon: duration }
      : simulateUntil(simulation, { firstHorizon, maxPanels: MAX_PANELS, enough: stable ? untilSettled(output, bandOf) : untilGrown });
  if (watched.outcome !== 'done') return watched.outcome;
  const axisEnd = duration ?? watched.axisEnd;
  const horizon = Math.max(watched.horizon, axisEnd);
  if (!simulation.advanceTo(horizon, MAX_PANELS)) return 'long';
  if (!isResolved(output) || !isResolved(control)) return 'coarse';
  return { output, control, horizon, axisEnd, finalValue };
}
