import { fileURLToPath } from 'node:url';

export interface WorkerEntry {
  readonly filename: string;
  readonly execArgv: string[];
}

/** Beside this file under tsx and vitest, where a thread needs its own TypeScript loader; beside the bundle when built. */
export function workerEntry(): WorkerEntry {
  const fromSource = import.meta.url.endsWith('.ts');
  const filename = fileURLToPath(new URL(fromSource ? './worker.ts' : './worker.mjs', import.meta.url));
  return { filename, execArgv: fromSource ? ['--import', new URL('./typescript-loader.mjs', import.meta.url).href] : [] };
}
