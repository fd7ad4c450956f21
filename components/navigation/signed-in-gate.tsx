import { useQuery } from '@tanstack/react-query';
import { Redirect } from 'expo-router';
import { type PropsWithChildren, useState } from 'react';
import { QueryView } from '@/components/ui/query-view';
import { meQuery } from '@/hooks/queries/me';
import { signInPath } from './routes';

const address = () => window.location.pathname + window.location.search;

/**
 * Lets those in who are signed in, and sends the others to sign in and back here. Until the pages behind it are shown the router knows
 * only "/", so the address asked for is read once, as the gate is first drawn; of a session that ends later it is where one is then.
 */
export function SignedInGate({ children }: PropsWithChildren) {
  const me = useQuery(meQuery);
  const [arrived] = useState(address);
  const [entered, setEntered] = useState(false);
  if (me.data && !entered) setEntered(true);
  if (me.data === null) return <ToSignIn next={entered ? address() : arrived} />;
  return (
    <QueryView query={me} waiting="Looking who is signed in">
      {() => children}
    </QueryView>
  );
}

/** Keeps the first address it was given: the window's own changes as it leads away. */
function ToSignIn({ next }: { next: string }) {
  const [asked] = useState(next);
  return <Redirect href={signInPath(asked)} />;
}
