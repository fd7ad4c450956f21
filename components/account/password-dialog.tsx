import { useForm } from 'react-hook-form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Form } from '@/components/ui/form';
import { FormField } from '@/components/ui/form-field';
import { sentence } from '@/hooks/api/problem';
import { useChangePassword } from '@/hooks/queries/session';

interface PasswordDialogProps {
  open: boolean;
  onClose: () => void;
  onChanged: () => void;
}

export function PasswordDialog({ open, onClose, onChanged }: PasswordDialogProps) {
  return (
    <Dialog open={open} title="Your password" onClose={onClose}>
      <PasswordForm onClose={onClose} onChanged={onChanged} />
    </Dialog>
  );
}

function PasswordForm({ onClose, onChanged }: Omit<PasswordDialogProps, 'open'>) {
  const change = useChangePassword();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ ResetPassword, SignIn }) => ResetPassword.extend({ currentPassword: SignIn.shape.password })),
    defaultValues: { currentPassword: '', newPassword: '' },
  });
  const submit = handleSubmit((values) => change.mutate(values, { onSuccess: onChanged }));
  return (
    <Form onSubmit={submit} problem={change.error && sentence(change.error)}>
      <FormField
        control={control}
        name="currentPassword"
        label="Password now"
        secureTextEntry
        autoComplete="current-password"
        onSubmitEditing={submit}
      />
      <FormField
        control={control}
        name="newPassword"
        label="New password"
        hint="12 characters or more."
        secureTextEntry
        autoComplete="new-password"
        onSubmitEditing={submit}
      />
      <DialogDecision label="Change the password" busy={change.isPending} onDecide={submit} onClose={onClose} />
    </Form>
  );
}
