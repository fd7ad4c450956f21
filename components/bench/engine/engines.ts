import type { Engine } from './engine';
import { pageEngine } from './page-engine';
import { workerEngine } from './worker-engine';

/** The bundler finds the worker's script by this very form, and names it after its content. */
const startWorker = (): Worker => new Worker(new URL('./engine-worker', window.location.href));

const startEngine = (): Engine => (typeof Worker === 'undefined' ? pageEngine : workerEngine(startWorker()));

/** Engines side by side: what is wanted at once never waits for what takes longer. */
export interface Engines {
  /** The shown case over frequency. */
  readonly curves: Engine;
  /** Its time responses. */
  readonly responses: Engine;
  /** All cases and their verdicts. */
  readonly cases: Engine;
  /** What is looked for at rest: room, and what each gain would break. */
  readonly search: Engine;
}

let started: Engines | null = null;

/** The page's engines; started when they are first asked for, and kept as long as the page. */
export function engines(): Engines {
  started ??= { curves: startEngine(), responses: startEngine(), cases: startEngine(), search: startEngine() };
  return started;
}
