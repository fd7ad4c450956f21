import type { FetchStatus } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { hasStatus, NoSignal, sentence } from '@/hooks/api/problem';
import { Trouble } from './trouble';
import { Waiting } from './waiting';

export interface QueryViewProps<Data> {
  query: { data: Data | undefined; error: Error | null; fetchStatus: FetchStatus; refetch: () => unknown };
  /** What is being waited for, as a line of text. */
  waiting: string;
  /** What to say where it does not exist. */
  missing?: string;
  children: (data: NonNullable<Data>) => ReactNode;
}

/** Data once it is there; before that the wait, the missing signal or the error, each with what can be done. What was read stays readable. */
export function QueryView<Data>({ query, waiting, missing, children }: QueryViewProps<Data>) {
  const { data, error, fetchStatus, refetch } = query;
  if (data !== undefined && data !== null) return children(data);
  const retry = () => void refetch();
  if (fetchStatus === 'paused' || error instanceof NoSignal) {
    return <Trouble title="No signal" text="This was not opened before, so there is nothing to show yet." onRetry={retry} />;
  }
  if (hasStatus(error, 404)) return <Trouble title="Not here" text={missing ?? 'There is nothing at this address.'} />;
  if (error) return <Trouble title="It did not load" text={sentence(error)} onRetry={retry} />;
  return <Waiting text={waiting} />;
}
