import type { LiveAnalyser } from './live-analyser';

/** The engine's answers at the rate at which they can be read. */
export type Readings<Input, Output> = Pick<LiveAnalyser<Input, Output>, 'get' | 'subscribe'>;

/** Digits that change more often than this are not read. */
const PACE_MS = 90;

/** Does a task once what is drawn now has been painted. */
function afterPaint(task: () => void): void {
  requestAnimationFrame(() => setTimeout(task, 0));
}

/**
 * Follows a source of answers for everything that is read and not looked at: numbers, sentences, the cursor's values. Curves are painted
 * first; what is read follows after the paint, at a pace of its own, and always ends with the newest.
 */
export function createReadings<Input, Output>(source: Readings<Input, Output>, later = afterPaint): Readings<Input, Output> {
  const listeners = new Set<() => void>();
  let shown = source.get();
  let due = false;
  let earliest = 0;
  const show = () => {
    due = false;
    earliest = performance.now() + PACE_MS;
    shown = source.get();
    for (const listener of listeners) listener();
  };
  const follow = () => {
    if (due || shown === source.get()) return;
    due = true;
    const wait = earliest - performance.now();
    if (wait <= 0) later(show);
    else setTimeout(() => later(show), wait);
  };
  let leave: (() => void) | null = null;
  return {
    get: () => shown,
    subscribe(listener) {
      listeners.add(listener);
      leave ??= source.subscribe(follow);
      follow();
      return () => {
        listeners.delete(listener);
        if (listeners.size > 0) return;
        leave?.();
        leave = null;
      };
    },
  };
}
