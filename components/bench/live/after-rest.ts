/** How long a gain rests before the answer is computed in full. */
const REST_MS = 120;

/** Does a task when nothing was asked for a while. Gives back what cancels it. */
export function afterRest(task: () => void): () => void {
  const timer = setTimeout(task, REST_MS);
  return () => clearTimeout(timer);
}
