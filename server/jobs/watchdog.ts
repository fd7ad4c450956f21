import { MessageChannel, type MessagePort } from 'node:worker_threads';

/** Counts from the moment the engine begins, and pulls the signal when it takes too long. */
export interface Watchdog {
  readonly started: MessagePort;
  readonly signal: AbortSignal;
  release(): void;
}

/** @param timeoutMs how long one computation may take, ms */
export function watchdog(timeoutMs: number): Watchdog {
  const abort = new AbortController();
  const { port1: heard, port2: started } = new MessageChannel();
  let timer: ReturnType<typeof setTimeout> | undefined;
  heard.once('message', () => {
    timer = setTimeout(() => abort.abort(), timeoutMs);
  });
  return {
    started,
    signal: abort.signal,
    release() {
      clearTimeout(timer);
      heard.close();
    },
  };
}
