import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useMay, useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { DocumentTitle } from '@/components/ui/document-title';
import { Note } from '@/components/ui/note';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { useLayout } from '@/components/ui/use-layout';
import { InvitationList } from './invitation-list';
import { InviteForm } from './invite-form';
import { MemberList } from './member-list';
import { PermissionTable } from './permission-table';

/** Who belongs to the project and who may do what; its owners change it here. */
export function MembersScreen() {
  const phone = useLayout() === 'phone';
  const { name, role, archived } = useProject();
  const manages = useMay('manage');
  const [inviting, setInviting] = useState(false);
  const [invited, setInvited] = useState<string | null>(null);
  const mayInvite = manages && !archived;
  const done = (email: string) => {
    setInvited(email);
    setInviting(false);
  };
  const foot = mayInvite ? (
    <View style={styles.share}>
      <Button kind="primary" label="Invite" tall stretch onPress={() => setInviting(true)} />
    </View>
  ) : null;
  return (
    <Page title="Members" sub={name} foot={foot}>
      <DocumentTitle parts={['Members', name]} />
      <View style={phone ? styles.stack : styles.side}>
        <Paper style={[styles.column, styles.over, !phone && styles.more]}>
          <MemberList />
          {mayInvite && !phone ? (
            <View style={styles.over}>
              <InviteForm onInvited={done} />
            </View>
          ) : null}
          {invited ? (
            <Banner lead={`A letter is on its way to ${invited}.`} text="Who confirms that address with an account is a member." />
          ) : null}
          {manages ? <InvitationList /> : null}
        </Paper>
        <Paper style={[styles.column, !phone && styles.share]}>
          <PermissionTable own={role} />
          <Note>A change acts at once. Who made a revision cannot sign it. The last owner stays.</Note>
        </Paper>
      </View>
      <Dialog open={inviting && phone} title="Invite" onClose={() => setInviting(false)}>
        <InviteForm onInvited={done} />
        <Button label="Not yet" onPress={() => setInviting(false)} />
      </Dialog>
    </Page>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', alignItems: 'flex-start', gap: 20 },
  stack: { gap: 8 },
  column: { gap: 12 },
  // The lists that drop out of its menus lie over what follows.
  over: { zIndex: 1 },
  more: { flex: 6, minWidth: 0 },
  share: { flex: 5, minWidth: 0 },
});
