import type { Response } from 'express';

/** An answer that goes on: each thing told is one Server-Sent Event whose data is JSON. */
export class EventStream<Told = unknown> {
  /** @param follow begins to tell, calls `end` after the last, and answers how to stop when the reader goes away */
  constructor(readonly follow: (tell: (thing: Told) => void, end: () => void) => () => void) {}
}

/** Proxies drop connections on which nothing is said. */
const HEARTBEAT_MS = 15_000;

export function sendEvents(response: Response, { follow }: EventStream): void {
  // no-transform keeps compression from holding events back until there are enough of them.
  response.status(200).set({ 'Content-Type': 'text/event-stream', 'Cache-Control': 'no-store, no-transform', 'X-Accel-Buffering': 'no' });
  response.flushHeaders();
  const heartbeat = setInterval(() => response.write(': still here\n\n'), HEARTBEAT_MS);
  const stop = follow(
    (thing) => response.write(`data: ${JSON.stringify(thing)}\n\n`),
    () => response.end(),
  );
  response.on('close', () => {
    clearInterval(heartbeat);
    stop();
  });
}
