export type CursorKind = 'frequency' | 'time';

/** One frequency (rad/s) and one time (s) that every chart reads; null where no cursor stands yet. */
export interface CursorStore {
  get(kind: CursorKind): number | null;
  set(kind: CursorKind, value: number | null): void;
  subscribe(listener: () => void): () => void;
}

export function createCursorStore(initial: Partial<Record<CursorKind, number>> = {}): CursorStore {
  const values: Record<CursorKind, number | null> = { frequency: initial.frequency ?? null, time: initial.time ?? null };
  const listeners = new Set<() => void>();
  return {
    get: (kind) => values[kind],
    set(kind, value) {
      if (values[kind] === value) return;
      values[kind] = value;
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}
