import type { Responses, TimeResponse, Warning } from '@/contract';
import type { LoopModel, SampledRun } from '@/analysis/loop/model';
import type { Failure } from '@/analysis/time/horizon';
import type { StepResponse } from '@/analysis/time/metrics';
import type { StepResponses } from '@/analysis/time/step-response';
import { shown, type TimeResponseOptions } from '@/analysis/time/time-response';
import { respondLimited, respondSampled } from './sampled-responses';

const warnings = {
  long: {
    code: 'responseTooLong',
    message: 'The response takes too many sample periods to be computed here: time responses are not given.',
  },
  boundless: {
    code: 'responseUnbounded',
    message: 'The response grows beyond all numbers within the time asked for: ask for a shorter one.',
  },
  staysLimited: {
    code: 'commandStaysLimited',
    message: 'A response ends with its command still at the actuator’s limit: what the step asks for is out of its reach.',
  },
} satisfies Record<string, Warning>;

interface Answer {
  readonly timeResponse: TimeResponse | null;
  readonly warnings: Warning[];
}

/**
 * Reference and load step of a sampled loop, with control and metrics, and within an actuator's limits with the linear response
 * beside them. null, with a warning that says why, where it would take too long.
 *
 * @throws LoopError for actuator limits without meaning
 */
export const sampledTime = (
  model: LoopModel,
  run: SampledRun,
  asked: { readonly responses: Responses; readonly stable: boolean } & TimeResponseOptions,
): Answer => {
  const { responses, stable } = asked;
  const linear = respondSampled(model, run, { stable, duration: responses.duration });
  if (typeof linear === 'string') return none(linear);
  if (!run.actuator) return { timeResponse: shown(linear, responses, asked), warnings: [] };
  const sizes = { reference: responses.referenceStep, load: responses.loadStep };
  const limited = respondLimited(model, run, { sizes, linear, stable, duration: responses.duration });
  if (typeof limited === 'string') return none(limited);
  const { metrics, ...series } = shown(limited, responses, asked);
  const { reference, load } = shown(onAxesOf(limited, linear), responses, { ...asked, stable: false });
  return {
    timeResponse: {
      ...series,
      linear: { reference: reference!, load: load! },
      metrics: metrics && { ...metrics, timeAtLimits: limited.timeAtLimits },
    },
    warnings: stable && limited.staysLimited ? [warnings.staysLimited] : [],
  };
};

const none = (failure: Failure): Answer => ({
  timeResponse: null,
  warnings: [failure === 'boundless' ? warnings.boundless : warnings.long],
});

/** The linear responses over the limited ones' time, as far as they are known. */
const onAxesOf = (limited: StepResponses, linear: StepResponses): StepResponses => {
  const over = (response: StepResponse, { axisEnd }: StepResponse) => ({ ...response, axisEnd: Math.min(response.horizon, axisEnd) });
  return { reference: over(linear.reference, limited.reference), load: over(linear.load, limited.load) };
};
