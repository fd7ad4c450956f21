import { useRouter } from 'expo-router';
import { projectPath, signInPath, signUpPath } from '@/components/navigation/routes';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { moment } from '@/components/ui/moment';
import { ProblemLine } from '@/components/ui/problem-line';
import { Text } from '@/components/ui/text';
import type { Me, OpenedInvitation } from '@/contract';
import { sentence } from '@/hooks/api/problem';
import { useAcceptInvitation } from '@/hooks/queries/invitations';
import { useSignOut } from '@/hooks/queries/session';

export interface InvitationAnswerProps {
  token: string;
  invitation: OpenedInvitation;
  /** Who is signed in; null where nobody is. */
  me: Me | null;
}

/** What can be done with an invitation, by whoever looks at it: come in, or first be the one whom it went to. */
export function InvitationAnswer({ token, invitation, me }: InvitationAnswerProps) {
  if (me === null) return <ComeFirst token={token} email={invitation.email} />;
  const invited = me.email.toLowerCase() === invitation.email.toLowerCase();
  return invited ? <Join token={token} invitation={invitation} /> : <OtherAccount token={token} email={invitation.email} me={me} />;
}

const backTo = (token: string) => `/invitation?token=${encodeURIComponent(token)}`;

function ComeFirst({ token, email }: { token: string; email: string }) {
  const router = useRouter();
  const next = backTo(token);
  return (
    <>
      <Text>
        It went to <Text weight={600}>{email}</Text>. Come in with the account of that address, or make one.
      </Text>
      <Button label="Make an account" kind="primary" tall stretch onPress={() => router.push(signUpPath(next, email))} />
      <Button label="Sign in" tall stretch onPress={() => router.push(signInPath(next, email))} />
    </>
  );
}

function Join({ token, invitation }: { token: string; invitation: OpenedInvitation }) {
  const router = useRouter();
  const accept = useAcceptInvitation(token);
  const join = () => accept.mutate(undefined, { onSuccess: ({ projectId }) => router.replace(projectPath(projectId)) });
  return (
    <>
      <Text tone="ink2">{`Open until ${moment(invitation.expiresAt, new Date())}. Your address ${invitation.email} is confirmed with it.`}</Text>
      <ProblemLine text={accept.error && sentence(accept.error)} />
      <Button label="Join the project" busyLabel="Joining" kind="primary" tall stretch busy={accept.isPending} onPress={join} />
      <Button label="Not now" tall stretch onPress={() => router.replace('/')} />
    </>
  );
}

function OtherAccount({ token, email, me }: { token: string; email: string; me: Me }) {
  const signOut = useSignOut(String(signInPath(backTo(token), email)));
  return (
    <>
      <Banner lead={`This invitation is for ${email}.`} text={`You are signed in as ${me.email}.`} />
      <ProblemLine text={signOut.error && sentence(signOut.error)} />
      <Button
        label="Use the other account"
        busyLabel="Signing out"
        kind="primary"
        tall
        stretch
        busy={signOut.isPending}
        onPress={() => signOut.mutate()}
      />
      <Text step="note" tone="ink2">
        It signs {me.name} out on this device first.
      </Text>
    </>
  );
}
