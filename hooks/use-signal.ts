import { onlineManager } from '@tanstack/react-query';
import { useSyncExternalStore } from 'react';

const subscribe = (listener: () => void) => onlineManager.subscribe(listener);
const read = () => onlineManager.isOnline();

/** Whether the server can be reached, as far as anyone knows. */
export const useSignal = (): boolean => useSyncExternalStore(subscribe, read, () => true);
