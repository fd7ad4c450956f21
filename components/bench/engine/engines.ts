import type { Engine } from './engine';
import { pageEngine } from './page-engine';
import { workerEngine } from './worker-engine';

/** The bundler finds the worker's script by this very form, and names it after its content. */
const startWorker = (): Worker => new Worker(new URL('./engine-worker', window.location.href));

const startEngine = (): Engine => (typeof Worker === 'undefined' ? pageEngine : workerEngine(startWorker()));

/** Two engines side by side: curves over frequency do not wait for responses, which take longer. */
export interface Engines {
  readonly curves: Engine;
  readonly responses: Engine;
}

let started: Engines | null = null;

/** The page's engines; started when they are first asked for, and kept as long as the page. */
export function engines(): Engines {
  started ??= { curves: startEngine(), responses: startEngine() };
  return started;
}
