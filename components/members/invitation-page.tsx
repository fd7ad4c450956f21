import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { EntryFrame } from '@/components/account/entry-frame';
import { Link } from '@/components/ui/link';
import { Text } from '@/components/ui/text';
import { Trouble } from '@/components/ui/trouble';
import { Waiting } from '@/components/ui/waiting';
import { hasStatus, NoSignal, sentence } from '@/hooks/api/problem';
import { meQuery } from '@/hooks/queries/me';
import { openedInvitationQuery } from '@/hooks/queries/invitations';
import { InvitationAnswer } from './invitation-answer';
import { roleWords } from './role-words';

const over = { title: 'Invitation', lead: 'This invitation has ended, was taken back, or was used before.' };

/** Where the link of an invitation leads: what one is asked into, and the way in, through an account of the invited address. */
export function InvitationPage() {
  const { token = '' } = useLocalSearchParams<{ token?: string }>();
  const me = useQuery(meQuery);
  const opened = useQuery({ ...openedInvitationQuery(token), enabled: token !== '' });
  const error = opened.error ?? me.error;
  const dead = token === '' || hasStatus(opened.error, 404);
  if (dead && !opened.data) {
    return (
      <EntryFrame {...over}>
        <Text tone="ink2">If you are a member, the project is in your list. If not, ask the person who invited you for a new one.</Text>
        <Link href="/">All projects</Link>
      </EntryFrame>
    );
  }
  const { data: invitation } = opened;
  if (!invitation || me.data === undefined) {
    return (
      <EntryFrame title="Invitation" lead="You were invited to a project.">
        {error ? (
          <Trouble
            title={error instanceof NoSignal ? 'No signal' : 'It did not load'}
            text={sentence(error)}
            onRetry={() => void Promise.all([opened.refetch(), me.refetch()])}
          />
        ) : (
          <Waiting text="Reading the invitation" />
        )}
      </EntryFrame>
    );
  }
  return (
    <EntryFrame title="Invitation" lead={`${invitation.invitedBy} invites you to ${invitation.project}, as ${invitation.role}.`}>
      <Text tone="ink2">{`In it you may: ${roleWords(invitation.role)}.`}</Text>
      <InvitationAnswer token={token} invitation={invitation} me={me.data} />
    </EntryFrame>
  );
}
