import { MessageChannel, type MessagePort } from 'node:worker_threads';

/** Counts from the moment the engine begins with a loop, anew for each, and pulls the signal when one takes too long. */
export interface Watchdog {
  readonly started: MessagePort;
  readonly signal: AbortSignal;
  /** Which loop of a task was begun last. */
  readonly begun: () => number;
  release(): void;
}

/** @param timeoutMs how long one loop may take, ms */
export function watchdog(timeoutMs: number): Watchdog {
  const abort = new AbortController();
  const { port1: heard, port2: started } = new MessageChannel();
  let timer: ReturnType<typeof setTimeout> | undefined;
  let begun = 0;
  heard.on('message', (index: number | null) => {
    begun = index ?? 0;
    clearTimeout(timer);
    timer = setTimeout(() => abort.abort(), timeoutMs);
  });
  return {
    started,
    signal: abort.signal,
    begun: () => begun,
    release() {
      clearTimeout(timer);
      heard.close();
    },
  };
}
