import { useCallback, useEffect, useRef } from 'react';
import type { View } from 'react-native';
import { useMe } from '@/hooks/queries/me';
import { type BenchCommand, commandOf, isTyping } from './bench-keys';

/** Keys of the bench: what its region is given so that it can have the focus and listen. It takes the focus when it opens. */
export function useBenchKeys(obey: (command: BenchCommand) => void) {
  const { singleKeys } = useMe().preferences;
  const region = useRef<View>(null);
  useEffect(() => {
    const free = document.activeElement === null || document.activeElement === document.body;
    if (free) (region.current as unknown as HTMLElement).focus({ preventScroll: true });
  }, []);
  const onKeyDown = useCallback(
    (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTyping(event.target)) return;
      const command = commandOf(event, singleKeys);
      if (command === null) return;
      event.preventDefault();
      obey(command);
    },
    [singleKeys, obey],
  );
  return { ref: region, tabIndex: -1 as const, onKeyDown };
}
