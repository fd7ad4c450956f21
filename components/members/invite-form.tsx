import { useForm, useWatch } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { contractResolver } from '@/components/forms/contract-resolver';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { FormField } from '@/components/ui/form-field';
import type { InvitedRole, InviteMember } from '@/contract';
import { ApiProblem, sentence } from '@/hooks/api/problem';
import { useInvite } from '@/hooks/queries/members';
import { RoleMenu } from './role-menu';

const roles: readonly InvitedRole[] = ['editor', 'reviewer', 'viewer'];
const nobody: InviteMember = { email: '', role: 'viewer' };

/** Asks someone into the project by their address. What is wrong with it stands at the field, and what was typed stays. */
export function InviteForm({ onInvited }: { onInvited?: (email: string) => void }) {
  const { id } = useProject();
  const announce = useAnnounce();
  const invite = useInvite(id);
  const { control, handleSubmit, reset, setError, setValue } = useForm<InviteMember>({
    resolver: contractResolver(({ InviteMember }) => InviteMember),
    defaultValues: nobody,
  });
  const role = useWatch({ control, name: 'role' });
  const atField = (error: unknown) => (error instanceof ApiProblem ? error.at('/email') : undefined);
  const submit = handleSubmit((values) =>
    invite.mutate(values, {
      onSuccess: ({ email }) => {
        announce(`Invited ${email}.`);
        reset({ ...nobody, role: values.role });
        onInvited?.(email);
      },
      onError: (error) => setError('email', { message: atField(error) }),
    }),
  );
  const problem = invite.error && !atField(invite.error) ? sentence(invite.error) : null;
  return (
    <Form onSubmit={submit} problem={problem} gap={6}>
      <View style={styles.line}>
        <View style={styles.email}>
          <FormField
            control={control}
            name="email"
            label="E-mail of someone new"
            inputMode="email"
            autoComplete="off"
            compact
            onSubmitEditing={submit}
          />
        </View>
        <View style={styles.decide}>
          <RoleMenu name="Role of someone new" role={role} roles={roles} onChoose={(choice) => setValue('role', choice)} />
          <Button kind="primary" label="Invite" busyLabel="Inviting" busy={invite.isPending} onPress={submit} />
        </View>
      </View>
    </Form>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', flexWrap: 'wrap', gap: 8, zIndex: 1 },
  email: { flexGrow: 1, flexBasis: 240 },
  // Beside the field, under the line of its label.
  decide: { flexDirection: 'row', alignSelf: 'flex-start', gap: 8, paddingTop: 28 },
});
