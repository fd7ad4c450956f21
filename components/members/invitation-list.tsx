import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { invitationsQuery } from '@/hooks/queries/members';
import { InvitationRow } from './invitation-row';

/** Who was asked into the project and has not come yet. */
export function InvitationList() {
  const { id } = useProject();
  const invitations = useQuery(invitationsQuery(id));
  return (
    <>
      <Heading level={2}>Invited, not here yet</Heading>
      <QueryView query={invitations} waiting="Fetching the invitations">
        {(items) =>
          items.length === 0 ? (
            <Text step="note" tone="ink2">
              Nobody is waiting.
            </Text>
          ) : (
            <View role="list" aria-label="Invitations">
              {items.map((invitation) => (
                <InvitationRow key={invitation.id} invitation={invitation} />
              ))}
            </View>
          )
        }
      </QueryView>
    </>
  );
}
