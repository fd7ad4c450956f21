import type { Form, Settings } from './settings';

/** The integral time that was last on the bench in a form; null where there was none. */
export const lastIntegralTime = (past: readonly Settings[], form: Form): number | null =>
  past.findLast((settings) => settings.form === form && settings.integral !== null)?.integral ?? null;

/** Over the crossover: integral action then costs 5.7° of phase there (common practice). */
const TIMES_CROSSOVER = 10;

/** A gentle integral time to begin with, s, two significant figures; 1 s where the loop has no crossover at `frequency` rad/s. */
export const startIntegralTime = (frequency: number | undefined): number =>
  frequency === undefined ? 1 : Number((TIMES_CROSSOVER / frequency).toPrecision(2));
