import { useQueryClient } from '@tanstack/react-query';
import { Banner } from '@/components/ui/banner';
import { useSignal } from '@/hooks/use-signal';
import { clock } from '@/components/ui/moment';

/** Says when the signal is gone, and how old what is shown is. */
export function SignalBanner() {
  const signal = useSignal();
  const client = useQueryClient();
  if (signal) return null;
  const newest = Math.max(
    0,
    ...client
      .getQueryCache()
      .getAll()
      .map((query) => query.state.dataUpdatedAt),
  );
  const seen = newest > 0 ? `You see what was fetched at ${clock(new Date(newest))}. ` : '';
  return <Banner icon="offline" lead="No signal." text={`${seen}A draft stays on this device; keeping it needs signal.`} />;
}
