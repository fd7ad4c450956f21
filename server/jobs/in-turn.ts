/** What a long computation tells, and how it is stopped: between its parts. */
export interface Watch {
  readonly signal?: AbortSignal;
  /** Hears how many cases are done with, each time some are. */
  readonly done?: (cases: number) => void;
}

/**
 * Works through items with only so many at once, so that others' tasks come in between and stopping leaves little running.
 *
 * @returns the results in the order of the items
 * @throws what the first failing item threw, or the signal's reason; no further item is begun then
 */
export async function inTurn<Item, Result>(
  items: readonly Item[],
  work: (item: Item) => Promise<Result>,
  { atOnce, signal }: Watch & { readonly atOnce: number },
): Promise<Result[]> {
  const results: Result[] = [];
  let next = 0;
  let failed = false;
  async function lane(): Promise<void> {
    while (next < items.length && !failed) {
      signal?.throwIfAborted();
      const index = next++;
      results[index] = await work(items[index]);
    }
  }
  const lanes = Array.from({ length: Math.min(atOnce, items.length) }, () =>
    lane().catch((error: unknown) => {
      failed = true;
      throw error;
    }),
  );
  await Promise.all(lanes);
  return results;
}
