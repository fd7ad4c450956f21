import type { Schedule } from './live-analyser';

/** How long a gain rests before the answer is computed in full. */
const REST_MS = 120;

function whenIdle(task: () => void): () => void {
  if (typeof requestIdleCallback !== 'function') {
    const timer = setTimeout(task, 0);
    return () => clearTimeout(timer);
  }
  const handle = requestIdleCallback(task, { timeout: 500 });
  return () => cancelIdleCallback(handle);
}

/** The page's own clock: coarse with the next frame, in full after a rest and when nothing else waits for the page. */
export const pageSchedule: Schedule = {
  frame(task) {
    const handle = requestAnimationFrame(task);
    return () => cancelAnimationFrame(handle);
  },
  rest(task) {
    let cancelIdle: (() => void) | null = null;
    const timer = setTimeout(() => {
      cancelIdle = whenIdle(task);
    }, REST_MS);
    return () => {
      clearTimeout(timer);
      cancelIdle?.();
    };
  },
};
