import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { moment } from '@/components/ui/moment';
import { ProblemLine } from '@/components/ui/problem-line';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { Invitation } from '@/contract';
import { sentence } from '@/hooks/api/problem';
import { useInviteAgain, useTakeBack } from '@/hooks/queries/members';

/** "viewer, invited 13 May by Mira Castellan, open until 27 May" */
export function invitationWords({ role, sentAt, invitedBy, expiresAt }: Invitation, now: Date): string {
  const over = new Date(expiresAt) <= now;
  const end = over ? `its link ended ${moment(expiresAt, now)}` : `open until ${moment(expiresAt, now)}`;
  return `${role}, invited ${moment(sentAt, now)} by ${invitedBy}, ${end}`;
}

/** One invitation that waits: sent when, by whom and until when; sent again with a new link, or taken back. */
export function InvitationRow({ invitation }: { invitation: Invitation }) {
  const { colors } = useTheme();
  const { id, archived } = useProject();
  const announce = useAnnounce();
  const again = useInviteAgain(id);
  const takeBack = useTakeBack(id);
  const { email } = invitation;
  const error = again.error ?? takeBack.error;
  // The row is gone by then, and with it callbacks of its own. What was refused is shown below.
  const back = () =>
    takeBack.mutateAsync(invitation).then(
      () => announce(`The invitation of ${email} is taken back.`),
      () => undefined,
    );
  return (
    <View role="listitem" style={[styles.row, { borderBottomColor: colors.rule }]}>
      <View style={styles.line}>
        <View style={styles.who}>
          <Text step="h3">{email}</Text>
          <Text step="small" tone="ink2">
            {invitationWords(invitation, new Date())}
          </Text>
        </View>
        <View style={styles.actions}>
          {archived ? null : (
            <Button
              label="Send again"
              aria-label={`Send the invitation of ${email} again`}
              busyLabel="Sending"
              busy={again.isPending}
              onPress={() => again.mutate(invitation, { onSuccess: () => announce(`Sent again to ${email}; the earlier link is over.`) })}
            />
          )}
          <Button
            kind="quiet"
            label="Take back"
            aria-label={`Take the invitation of ${email} back`}
            busy={takeBack.isPending}
            onPress={back}
          />
        </View>
      </View>
      {again.isSuccess ? (
        <Text role="status" step="small" tone="ink2">
          Sent again. The earlier link opens nothing any more.
        </Text>
      ) : null}
      <ProblemLine text={error && sentence(error)} />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1, paddingVertical: 8, gap: 4 },
  line: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: 8 },
  who: { flexGrow: 1, flexBasis: 220, minWidth: 0, gap: 1 },
  actions: { flexDirection: 'row', gap: 4 },
});
