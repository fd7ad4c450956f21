// Stands in for the engine's worker: never ends with a dead time of 1 s, breaks with 2 s, uses all memory with 3 s, and answers otherwise.
const never = () => {
  for (;;);
};

const hoard = () => {
  const kept = [];
  for (;;) kept.push(new Array(1e6).fill({}));
};

export function describe({ plant, started }) {
  started.postMessage(null);
  if (plant.deadTime === 1) never();
  if (plant.deadTime === 2) throw new Error('broken');
  if (plant.deadTime === 3) hoard();
  return { value: { words: `${plant.deadTime} s` } };
}
