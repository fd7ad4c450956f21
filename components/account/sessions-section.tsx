import { useQuery } from '@tanstack/react-query';
import { Button } from '@/components/ui/button';
import { moment } from '@/components/ui/moment';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { sentence } from '@/hooks/api/problem';
import { sessionsQuery, useRevokeSession } from '@/hooks/queries/me';
import { useSignOut } from '@/hooks/queries/session';
import { SettingRow } from './setting-row';

/** Where one is signed in, this device first; each of the others can be signed out from here. */
export function SessionsSection() {
  const sessions = useQuery(sessionsQuery);
  const revoke = useRevokeSession();
  const signOut = useSignOut();
  const error = revoke.error ?? signOut.error;
  return (
    <>
      <Heading level={2}>Signed in on</Heading>
      <QueryView query={sessions} waiting="Fetching devices">
        {(devices) =>
          [...devices]
            .sort((a, b) => Number(b.current) - Number(a.current))
            .map(({ id, current, device, lastSeenAt }) => (
              <SettingRow key={id} name={device} about={current ? 'this device' : `last seen ${moment(lastSeenAt, new Date(), true)}`}>
                {current ? (
                  <Button label="Sign out" busyLabel="Signing out" busy={signOut.isPending} onPress={() => signOut.mutate()} />
                ) : (
                  <Button
                    label="Sign out"
                    aria-label={`Sign out ${device}`}
                    busy={revoke.isPending && revoke.variables === id}
                    onPress={() => revoke.mutate(id)}
                  />
                )}
              </SettingRow>
            ))
        }
      </QueryView>
      {error ? <Text tone="fail">{sentence(error)}</Text> : null}
    </>
  );
}
