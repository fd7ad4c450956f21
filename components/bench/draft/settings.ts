import type { DesignContent } from '@/contract';

/** What the bench moves: parallel gains, set-point weights, feedforward, and what is stated about sampling. Times in s. */
export interface Settings {
  readonly kp: number;
  readonly ki: number;
  readonly kd: number;
  readonly filterTime: number;
  readonly proportionalWeight: number;
  readonly derivativeWeight: number;
  readonly feedforward: number;
  /** true where someone states that the loop is continuous; false where nobody said. */
  readonly statedContinuous: boolean;
}

/** A proportional loop of gain one: it shows the plant as it is, and nothing is moved yet. */
export const startSettings: Settings = {
  kp: 1,
  ki: 0,
  kd: 0,
  filterTime: 0,
  proportionalWeight: 1,
  derivativeWeight: 0,
  feedforward: 0,
  statedContinuous: false,
};

/** The settings of a design's content; null where its controller is not in parallel form, which the bench does not move. */
export function settingsOf({ controller, sampling }: DesignContent): Settings | null {
  if (controller.form !== 'parallel') return null;
  return {
    kp: controller.kp,
    ki: controller.ki,
    kd: controller.kd,
    filterTime: controller.derivativeFilterTime,
    proportionalWeight: controller.setpointWeights.proportional,
    derivativeWeight: controller.setpointWeights.derivative,
    feedforward: controller.feedforward.gain,
    statedContinuous: sampling === 'continuous',
  };
}

/** The content to keep: `settings` written over `base`, whose filters, actuator and sample period stay as they are. */
export function contentWith(base: DesignContent | null, settings: Settings): DesignContent {
  const sampled = base?.sampling !== null && typeof base?.sampling === 'object' ? base.sampling : null;
  return {
    controller: {
      form: 'parallel',
      kp: settings.kp,
      ki: settings.ki,
      kd: settings.kd,
      derivativeFilterTime: settings.filterTime,
      setpointWeights: { proportional: settings.proportionalWeight, derivative: settings.derivativeWeight },
      feedforward: { gain: settings.feedforward },
      filters: base?.controller.filters ?? [],
    },
    sampling: settings.statedContinuous ? 'continuous' : sampled,
    actuator: base?.actuator ?? null,
  };
}

const fields = Object.keys(startSettings) as (keyof Settings)[];

export const sameSettings = (a: Settings, b: Settings): boolean => fields.every((field) => a[field] === b[field]);
