import { createContext, type PropsWithChildren, useCallback, useContext, useRef, useState } from 'react';
import { Text } from './text';

const LEAST_INTERVAL_MS = 1000;

const AnnounceContext = createContext<(text: string) => void>(() => undefined);

/** Holds the one polite live region. Said at most once a second: of several texts within a second the last one is said. */
export function AnnouncementsProvider({ children }: PropsWithChildren) {
  const [spoken, setSpoken] = useState('');
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const pending = useRef('');
  const announce = useCallback((text: string) => {
    pending.current = text;
    timer.current ??= setTimeout(() => {
      timer.current = null;
      setSpoken(pending.current);
    }, LEAST_INTERVAL_MS);
  }, []);
  return (
    <AnnounceContext.Provider value={announce}>
      {children}
      <Text aria-live="polite" style={{ position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 }}>
        {spoken}
      </Text>
    </AnnounceContext.Provider>
  );
}

/** Tells those who listen what those who look can see: kept, undone, a verdict that changed. */
export const useAnnounce = () => useContext(AnnounceContext);
