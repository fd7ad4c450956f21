import { onlineManager } from '@tanstack/react-query';

const PROBE_INTERVAL_MS = 5000;

let probe: ReturnType<typeof setInterval> | null = null;

/** A request was answered, whatever the answer. */
export function reportSignal(): void {
  if (probe) clearInterval(probe);
  probe = null;
  onlineManager.setOnline(true);
}

/**
 * A request was not answered. The browser's own idea of being online is not enough: a garage's network may be up and the server out of
 * reach. From here on queries wait, and a small question every few seconds finds out when they may go on.
 */
export function reportLostSignal(): void {
  onlineManager.setOnline(false);
  probe ??= setInterval(() => {
    fetch('/api/health').then(reportSignal, () => undefined);
  }, PROBE_INTERVAL_MS);
}
