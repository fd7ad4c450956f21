import { useQuery } from '@tanstack/react-query';
import { Redirect, usePathname } from 'expo-router';
import type { PropsWithChildren } from 'react';
import { QueryView } from '@/components/ui/query-view';
import { meQuery } from '@/hooks/queries/me';
import { signInPath } from './routes';

/** Lets those in who are signed in, and sends the others to sign in and back here. */
export function SignedInGate({ children }: PropsWithChildren) {
  const me = useQuery(meQuery);
  const pathname = usePathname();
  if (me.data === null) return <Redirect href={signInPath(pathname + window.location.search)} />;
  return (
    <QueryView query={me} waiting="Looking who is signed in">
      {() => children}
    </QueryView>
  );
}
