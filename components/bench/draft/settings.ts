import type { Controller, DesignContent, Filter } from '@/contract';

export type Form = Controller['form'];
export type TimedForm = Exclude<Form, 'parallel'>;

/** The four numbers that have a rule of their own. What the middle two mean depends on the form. */
export interface Gains {
  readonly form: Form;
  readonly kp: number;
  /** Ki in parallel form, else Ti in s; null: no integral action, in a form that has times. */
  readonly integral: number | null;
  /** Kd in parallel form, else Td in s. */
  readonly derivative: number;
  /** Tf, s. */
  readonly filterTime: number;
}

/** What the bench moves: gains, set-point weights, feedforward, filters, and what is stated about sampling. */
export interface Settings extends Gains {
  readonly proportionalWeight: number;
  readonly derivativeWeight: number;
  /** Command per unit of reference. */
  readonly feedforward: number;
  /** In the order in which they stand at the controller's output. */
  readonly filters: readonly Filter[];
  /** true where someone states that the loop is continuous; false where nobody said. */
  readonly statedContinuous: boolean;
}

/** A proportional loop of gain one: it shows the plant as it is, and nothing is moved yet. */
export const startSettings: Settings = {
  form: 'parallel',
  kp: 1,
  integral: 0,
  derivative: 0,
  filterTime: 0,
  proportionalWeight: 1,
  derivativeWeight: 0,
  feedforward: 0,
  filters: [],
  statedContinuous: false,
};

/** The gains of a controller in whatever form it is written. */
export const gainsOf = (controller: Controller): Gains => ({
  form: controller.form,
  kp: controller.kp,
  integral: controller.form === 'parallel' ? controller.ki : controller.ti,
  derivative: controller.form === 'parallel' ? controller.kd : controller.td,
  filterTime: controller.derivativeFilterTime,
});

export const settingsOf = ({ controller, sampling }: DesignContent): Settings => ({
  ...gainsOf(controller),
  proportionalWeight: controller.setpointWeights.proportional,
  derivativeWeight: controller.setpointWeights.derivative,
  feedforward: controller.feedforward.gain,
  filters: controller.filters,
  statedContinuous: sampling === 'continuous',
});

/** The controller that settings make. */
export function controllerOf(settings: Settings): Controller {
  const { form, kp, integral, derivative } = settings;
  const shared = {
    kp,
    derivativeFilterTime: settings.filterTime,
    setpointWeights: { proportional: settings.proportionalWeight, derivative: settings.derivativeWeight },
    feedforward: { gain: settings.feedforward },
    filters: [...settings.filters],
  };
  if (form === 'parallel') return { form, ki: integral ?? 0, kd: derivative, ...shared };
  return { form, ti: integral, td: derivative, ...shared };
}

/** The content to keep: `settings` written over `base`, whose actuator and sample period stay as they are. */
export function contentWith(base: DesignContent | null, settings: Settings): DesignContent {
  const sampled = base?.sampling !== null && typeof base?.sampling === 'object' ? base.sampling : null;
  return {
    controller: controllerOf(settings),
    sampling: settings.statedContinuous ? 'continuous' : sampled,
    actuator: base?.actuator ?? null,
  };
}

const fields = Object.keys(startSettings) as (keyof Settings)[];

const sameFilter = (a: Filter, b: Filter): boolean =>
  (Object.keys({ ...a, ...b }) as (keyof Filter)[]).every((field) => a[field] === b[field]);

export const sameFilters = (a: readonly Filter[], b: readonly Filter[]): boolean =>
  a === b || (a.length === b.length && a.every((filter, n) => sameFilter(filter, b[n])));

export const sameSettings = (a: Settings, b: Settings): boolean =>
  fields.every((field) => (field === 'filters' ? sameFilters(a.filters, b.filters) : a[field] === b[field]));
