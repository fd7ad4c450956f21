export interface Lane<Item> {
  /** Takes an item up at once, or keeps it in place of the one that waits. */
  push(item: Item): void;
  /** Forgets what waits; what was begun is ended. */
  clear(): void;
}

/** Does one thing at a time. Of those that come meanwhile only the newest is taken up next, so that nothing queues. */
export function createLane<Item>(work: (item: Item) => Promise<void>): Lane<Item> {
  let busy = false;
  let next: { readonly item: Item } | null = null;
  const take = async (item: Item) => {
    busy = true;
    try {
      await work(item);
    } finally {
      busy = false;
      if (next !== null) push(next.item);
    }
  };
  const push = (item: Item) => {
    next = busy ? { item } : null;
    if (!busy) void take(item);
  };
  return {
    push,
    clear() {
      next = null;
    },
  };
}
