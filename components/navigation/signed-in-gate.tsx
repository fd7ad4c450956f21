import { useQuery } from '@tanstack/react-query';
import { Redirect } from 'expo-router';
import { type PropsWithChildren, useState } from 'react';
import { QueryView } from '@/components/ui/query-view';
import { meQuery } from '@/hooks/queries/me';
import { signInPath } from './routes';

/** Lets those in who are signed in, and sends the others to sign in and back here. */
export function SignedInGate({ children }: PropsWithChildren) {
  const me = useQuery(meQuery);
  if (me.data === null) return <ToSignIn />;
  return (
    <QueryView query={me} waiting="Looking who is signed in">
      {() => children}
    </QueryView>
  );
}

/** The address is read from the window, and once: the router's own is not settled while it starts, and changes as it leads away. */
function ToSignIn() {
  const [asked] = useState(() => window.location.pathname + window.location.search);
  return <Redirect href={signInPath(asked)} />;
}
