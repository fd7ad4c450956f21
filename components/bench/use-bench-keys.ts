import { useEffect, useRef } from 'react';
import type { View } from 'react-native';
import { useMe } from '@/hooks/queries/me';
import { type BenchCommand, commandOf, isTyping } from './bench-keys';

/**
 * Listens to the keys of the bench while it has the focus or nothing has it. It does not take the focus itself, which would draw a ring
 * round the whole page. Gives the ref of its region.
 */
export function useBenchKeys(obey: (command: BenchCommand) => void) {
  const { singleKeys } = useMe().preferences;
  const region = useRef<View>(null);
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      const own = event.target === document.body || (region.current as unknown as HTMLElement).contains(event.target as Node);
      if (!own || event.defaultPrevented || isTyping(event.target)) return;
      const command = commandOf(event, singleKeys);
      if (command === null) return;
      event.preventDefault();
      obey(command);
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [singleKeys, obey]);
  return region;
}
