import type { Responses, TimeResponse, Warning } from '@/contract';
import type { LoopModel, SampledRun } from '@/analysis/loop/model';
import { finalValues } from '@/analysis/time/final-values';
import type { Failure } from '@/analysis/time/horizon';
import { answersReference } from '@/analysis/time/linear-loop';
import type { StepResponse } from '@/analysis/time/metrics';
import { bands, silence, watch, type StepResponses } from '@/analysis/time/step-response';
import { shown, type TimeResponseOptions } from '@/analysis/time/time-response';
import { OutOfWork, WorkBudget } from '@/analysis/time/work-budget';
import { equationOf } from './difference-equation';
import { SampledSimulation, type ContinuousHalf, type StepSizes } from './sampled-simulation';
import { splitDelay } from './split-delay';
import { stateEquations } from './state-equations';

/**
 * The fastest decay that the curves follow between samples, in e-foldings a period: what is faster hardly shows beside what is
 * slower, and where it does the panels are found too coarse and all of it is followed.
 */
const FOLLOWED = [40, Infinity];

/** The first look at a response reaches past its delay by so many samples. */
const FIRST_SAMPLES = 8;

const warnings = {
  long: {
    code: 'responseTooLong',
    message: 'The response takes too many sample periods to be computed here: time responses are not given.',
  },
  boundless: {
    code: 'responseUnbounded',
    message: 'The response grows beyond all numbers within the time asked for: ask for a shorter one.',
  },
} satisfies Record<string, Warning>;

export interface SampledQuestion {
  readonly stable: boolean;
  readonly duration: number | null;
}

/** The two unit step responses of a sampled loop, at and between the samples, or why there are none. */
export const respondSampled = (model: LoopModel, run: SampledRun, question: SampledQuestion): StepResponses | Failure => {
  const budget = new WorkBudget();
  try {
    for (const fastest of FOLLOWED) {
      const attempt = responsesOf(model, run, { ...question, fastest, budget });
      if (attempt !== 'coarse') return attempt;
    }
    return 'coarse';
  } catch (error) {
    if (!(error instanceof OutOfWork)) throw error;
    return 'long';
  }
};

const responsesOf = (
  model: LoopModel,
  run: SampledRun,
  { fastest, budget, ...question }: SampledQuestion & { readonly fastest: number; readonly budget: WorkBudget },
): StepResponses | Failure => {
  const half = continuousHalf(model, run, fastest);
  const equation = equationOf(model, run);
  const finals = finalValues(model);
  const firstHorizon =
    2 * (model.plantDeadTime + model.sensorDeadTime + run.sampling.computationDelay) + FIRST_SAMPLES * run.sampling.period;
  const respond = (kind: keyof typeof bands, sizes: StepSizes): StepResponse | Failure =>
    watch(question, {
      simulation: new SampledSimulation(half, equation, sizes, budget),
      firstHorizon,
      finalValue: finals[kind],
      bandOf: bands[kind],
    });
  const load = respond('load', { reference: 0, load: 1 });
  if (typeof load === 'string') return load;
  const reference = answersReference(model) ? respond('reference', { reference: 1, load: 0 }) : silence(load);
  return typeof reference === 'string' ? reference : { reference, load };
};

/**
 * Reference and load step of a sampled loop, with control and metrics; null, with a warning that says why, where it would take
 * too long.
 */
export const sampledResponse = (
  model: LoopModel,
  run: SampledRun,
  { responses, stable, points }: { readonly responses: Responses; readonly stable: boolean } & TimeResponseOptions,
): { timeResponse: TimeResponse | null; warnings: Warning[] } => {
  const steps = respondSampled(model, run, { stable, duration: responses.duration });
  if (typeof steps === 'string') return { timeResponse: null, warnings: [steps === 'boundless' ? warnings.boundless : warnings.long] };
  return { timeResponse: shown(steps, responses, { stable, points }), warnings: [] };
};

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
