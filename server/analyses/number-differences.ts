import type { Recomputed } from '@/contract';

type Difference = Recomputed['differences'][number];
type Leaf = number | null;

/** Every number of a result by its path: `margins.gainCrossovers.0.frequency`. Whether a loop is stable counts as 1 or 0. */
function* leaves(value: unknown, path: string): Generator<[string, Leaf]> {
  if (value === null || typeof value === 'number') yield [path, value];
  else if (typeof value === 'boolean') yield [path, Number(value)];
  else if (typeof value === 'object') {
    for (const [key, inner] of Object.entries(value)) yield* leaves(inner, path === '' ? key : `${path}.${key}`);
  }
}

const agree = (kept: Leaf, now: Leaf, tolerance: number) =>
  kept === now || (kept !== null && now !== null && Math.abs(kept - now) <= tolerance * Math.max(Math.abs(kept), Math.abs(now)));

/**
 * Where the numbers of one case came out otherwise.
 *
 * @param tolerance relative; 0 where the same engine must give the same digits
 */
export function numberDifferences(name: string, numbers: { kept: unknown; now: unknown }, tolerance: number): Difference[] {
  const kept = new Map(leaves(numbers.kept, ''));
  const now = new Map(leaves(numbers.now, ''));
  return [...new Set([...kept.keys(), ...now.keys()])]
    .map((quantity) => ({ case: name, quantity, kept: kept.get(quantity) ?? null, now: now.get(quantity) ?? null }))
    .filter((difference) => !agree(difference.kept, difference.now, tolerance));
}
