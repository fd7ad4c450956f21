import type { LoopModel, SampledRun } from '@/analysis/loop/model';
import { finalValues } from '@/analysis/time/final-values';
import type { Failure } from '@/analysis/time/horizon';
import { answersReference } from '@/analysis/time/linear-loop';
import type { StepResponse } from '@/analysis/time/metrics';
import { bands, silence, watch, type Run, type StepResponses } from '@/analysis/time/step-response';
import { OutOfWork, WorkBudget } from '@/analysis/time/work-budget';
import { actuatorLimits } from './actuator-limits';
import { equationOf } from './difference-equation';
import { SampledSimulation, type ContinuousHalf } from './sampled-simulation';
import { splitDelay } from './split-delay';
import { stateEquations } from './state-equations';

/**
 * The fastest decay that the curves follow between samples, in e-foldings a period: what is faster hardly shows beside what is
 * slower, and where it does the panels are found too coarse and all of it is followed.
 */
const FOLLOWED = [40, Infinity];

/** The first look at a response reaches past its delay by so many samples. */
const FIRST_SAMPLES = 8;

/** A limited response that has not settled after so many times what the linear one was watched for never will. */
const PATIENCE = 8;

export interface SampledQuestion {
  readonly stable: boolean;
  readonly duration: number | null;
}

/** The two unit step responses of a sampled loop, at and between the samples, or why there are none. */
export const respondSampled = (model: LoopModel, run: SampledRun, question: SampledQuestion): StepResponses | Failure =>
  resolved((fastest, budget) => {
    const course = courseOf(model, run, fastest);
    const respond = (kind: StepKind): StepResponse | Failure => {
      const simulation = new SampledSimulation({ ...course, sizes: sizesOf(kind, 1), limits: null, budget });
      return watch(question, watched(model, run, { kind, simulation }));
    };
    const load = respond('load');
    if (typeof load === 'string') return load;
    const reference = answersReference(model) ? respond('reference') : silence(load);
    return typeof reference === 'string' ? reference : { reference, load };
  });

export interface LimitedResponses extends StepResponses {
  /** How long the reference response's command was held back, s. */
  readonly timeAtLimits: number;
  /** Whether a response ended with its command still held back. */
  readonly staysLimited: boolean;
}

/**
 * The same within the actuator's limits, for steps of these sizes; the curves are per unit of the step, as the linear ones.
 *
 * @throws LoopError for limits without meaning
 */
export const respondLimited = (
  model: LoopModel,
  run: SampledRun,
  { sizes, linear, ...question }: SampledQuestion & { readonly sizes: Record<StepKind, number>; readonly linear: StepResponses },
): LimitedResponses | Failure => {
  const limits = actuatorLimits(run.actuator!, model.gains, run.sampling.period);
  return resolved((fastest, budget) => {
    const course = courseOf(model, run, fastest);
    const respond = (kind: StepKind) => {
      if (sizes[kind] === 0 || (kind === 'reference' && !answersReference(model)))
        return { response: silence(linear[kind]), atLimits: 0, stays: false };
      const simulation = new SampledSimulation({ ...course, sizes: sizesOf(kind, sizes[kind]), limits, budget });
      const response = watch(question, { ...watched(model, run, { kind, simulation }), patience: PATIENCE * linear[kind].horizon });
      if (typeof response === 'string') return response;
      return { response, atLimits: simulation.timeAtLimits(response.axisEnd), stays: simulation.isLimited };
    };
    const load = respond('load');
    if (typeof load === 'string') return load;
    const reference = respond('reference');
    if (typeof reference === 'string') return reference;
    return {
      reference: reference.response,
      load: load.response,
      timeAtLimits: reference.atLimits,
      staysLimited: reference.stays || load.stays,
    };
  });
};

type StepKind = keyof typeof bands;

const sizesOf = (kind: StepKind, size: number) => ({ reference: 0, load: 0, [kind]: size });

const watched = (
  model: LoopModel,
  { sampling }: SampledRun,
  { kind, simulation }: { kind: StepKind; simulation: SampledSimulation },
): Run => ({
  simulation,
  firstHorizon: 2 * (model.plantDeadTime + model.sensorDeadTime + sampling.computationDelay) + FIRST_SAMPLES * sampling.period,
  finalValue: finalValues(model)[kind],
  bandOf: bands[kind],
});

/** Tries with few panels first, and with all of them where those do not follow the curves. */
const resolved = <Responses>(attempt: (fastest: number, budget: WorkBudget) => Responses | Failure): Responses | Failure => {
  const budget = new WorkBudget();
  try {
    for (const fastest of FOLLOWED) {
      const found = attempt(fastest, budget);
      if (found !== 'coarse') return found;
    }
    return 'coarse';
  } catch (error) {
    if (!(error instanceof OutOfWork)) throw error;
    return 'long';
  }
};

const courseOf = (model: LoopModel, run: SampledRun, fastest: number) => ({
  half: continuousHalf(model, run, fastest),
  equation: equationOf(model, run),
});

const continuousHalf = (model: LoopModel, { sampling: { period, computationDelay } }: SampledRun, fastest: number): ContinuousHalf => {
  const { plant, sensor, plantDeadTime, sensorDeadTime } = model;
  return {
    equations: stateEquations([plant, sensor]),
    poles: [...plant.poles, ...sensor.poles].filter(({ re }) => -re * period <= fastest),
    delay: splitDelay(plantDeadTime + sensorDeadTime + computationDelay, period),
    computationDelay,
    plantDeadTime,
  };
};
