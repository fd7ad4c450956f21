import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel } from '@/analysis/loop/model';
import { Curve } from './curve';
import type { FinalValues } from './final-values';
import { GROWN, hasGrown, hasSettled, isTooFine, simulateTo, simulateUntil, type Enough, type Failure, type Running } from './horizon';
import { monotoneKnots, type Knots } from './knots';
import { answersReference } from './linear-loop';
import type { LoopSystem } from './loop-system';
import type { StepResponse } from './metrics';
import { NODE_COUNT } from './nodes';
import { planPanels } from './panel-plan';
import { firstPassage, lastOutside } from './passages';
import { loadBand, referenceBand } from './settling';
import { Simulation } from './simulation';
import { Tracks } from './track';
import { OutOfWork, WorkBudget } from './work-budget';

/** How panels are chosen, one way after the other until a response is resolved: as the poles ask and widening, then finer. */
const MANNERS: readonly Manner[] = [
  { fineness: 1, widening: true },
  { fineness: 1, widening: false },
  { fineness: 2, widening: false },
  { fineness: 4, widening: false },
  { fineness: 8, widening: false },
];

interface Manner {
  readonly fineness: number;
  readonly widening: boolean;
}

/** The first look at a response reaches past its dead time by so many panels. */
const FIRST_PANELS = 4;

/** The axis is this multiple of the settling time: between the 1.25 and 2 that numerics.md allows. */
const AXIS_PER_SETTLING = 1.6;

type StepKind = 'reference' | 'load';
/** The band in which each response counts as settled. */
export const bands = { reference: referenceBand, load: loadBand };

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

/** The responses to a unit reference and a unit load step, or why there are none. */
export function stepResponses(question: StepQuestion): StepResponses | 'long' | 'boundless' {
  const budget = new WorkBudget();
  try {
    for (const manner of MANNERS) {
      const attempt = attemptResponses(question, manner, budget);
      if (attempt !== 'coarse') return attempt;
    }
  } catch (error) {
    if (!(error instanceof OutOfWork)) throw error;
  }
  return 'long';
}

function attemptResponses(question: StepQuestion, { fineness, widening }: Manner, budget: WorkBudget): StepResponses | Failure {
  const { system, finalValues, model } = question;
  const stages = planPanels(question.poles, system.deadTime || Infinity, fineness);
  const tracks = new Tracks(system, stages, budget);
  if (isTooFine(tracks.first)) return 'long';
  const firstHorizon = 2 * system.deadTime + FIRST_PANELS * stages[0].width;
  const respond = (kind: StepKind) => {
    const simulation = new Simulation({
      system,
      tracks,
      initial: kind === 'reference' ? system.initial(1, 0) : system.initial(0, 1),
      outputDelay: model.plantDeadTime,
      widening: widening && question.stable && system.deadTime > 0,
      budget,
    });
    return watch(question, { simulation, firstHorizon, finalValue: finalValues[kind], bandOf: bands[kind] });
  };
  const load = respond('load');
  if (typeof load === 'string') return load;
  const reference = answersReference(model) ? respond('reference') : silence(load);
  return typeof reference === 'string' ? reference : { reference, load };
}

/** No response at all, on the axis of one that there is. */
export function silence({ horizon, axisEnd }: StepResponse): StepResponse {
  const nothing = new Curve();
  nothing.append(0, horizon, new Float64Array(NODE_COUNT), 0);
  return { output: nothing, control: nothing, knots: monotoneKnots(nothing, horizon), horizon, axisEnd, finalValue: 0 };
}

export interface Run {
  readonly simulation: Running;
  readonly firstHorizon: number;
  readonly finalValue: number | null;
  readonly bandOf: typeof referenceBand;
  /** A stable response that has not settled by then is taken as it is, s. */
  readonly patience?: number;
}

/** Simulates one response for as long as it takes to judge it and to show it. */
export function watch(
  { stable, duration }: Pick<StepQuestion, 'stable' | 'duration'>,
  { simulation, firstHorizon, finalValue, bandOf, patience = Infinity }: Run,
): StepResponse | Failure {
  const { output, control } = simulation;
  const bandFor = (peak: number) => bandOf(finalValue, peak);
  const settles = hasSettled(bandFor);
  const shows: Enough = stable ? (curve, time) => settles(curve, time) || time >= patience : hasGrown;
  const judged = stable || duration === null ? simulateUntil(simulation, firstHorizon, shows) : 0;
  if (typeof judged === 'string') return judged;
  const horizon = Math.max(judged, duration ?? 0);
  const failure = simulateTo(simulation, horizon);
  if (failure) return failure;
  const knots = monotoneKnots(output, horizon);
  const settled = stable ? AXIS_PER_SETTLING * (lastOutside(output, knots, bandFor(output.size)) ?? 0) : grownAt(output, knots);
  return { output, control, knots, horizon, axisEnd: duration ?? (settled || horizon), finalValue };
}

/** When the output first reached ten times the unit step; 0 if it never did. */
function grownAt(output: Curve, knots: Knots): number {
  const passages = [GROWN, -GROWN].map((level) => firstPassage(output, knots, level) ?? Infinity);
  return Number.isFinite(Math.min(...passages)) ? Math.min(...passages) : 0;
}
