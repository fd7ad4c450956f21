import { createContext, type PropsWithChildren, useCallback, useContext, useState, useSyncExternalStore } from 'react';
import { createCursorStore, type CursorKind, type CursorStore } from './cursor-store';

const CursorContext = createContext<CursorStore | null>(null);

/** Gives all charts below it one cursor. A store made outside may be handed in, so that a screen can read or set it. */
export function CursorProvider({ store, children }: PropsWithChildren<{ store?: CursorStore }>) {
  const [own] = useState(() => store ?? createCursorStore());
  return <CursorContext.Provider value={store ?? own}>{children}</CursorContext.Provider>;
}

/** The store itself, for a chart's pointer layer: reading it does not re-render. */
export function useCursorStore(): CursorStore {
  const store = useContext(CursorContext);
  if (store === null) throw new Error('A chart stands inside a CursorProvider.');
  return store;
}

/** The cursor's value and its setter. Only what calls this is rendered again when the cursor moves. */
export function useCursor(kind: CursorKind): [number | null, (value: number | null) => void] {
  const store = useCursorStore();
  const read = () => store.get(kind);
  const set = useCallback((next: number | null) => store.set(kind, next), [store, kind]);
  return [useSyncExternalStore(store.subscribe, read, read), set];
}
