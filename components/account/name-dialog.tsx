import { useForm } from 'react-hook-form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Form } from '@/components/ui/form';
import { FormField } from '@/components/ui/form-field';
import { sentence } from '@/hooks/api/problem';
import { useMe, useUpdateMe } from '@/hooks/queries/me';

interface NameDialogProps {
  open: boolean;
  onClose: () => void;
}

export function NameDialog({ open, onClose }: NameDialogProps) {
  return (
    <Dialog open={open} title="Your name" onClose={onClose}>
      <NameForm onClose={onClose} />
    </Dialog>
  );
}

function NameForm({ onClose }: { onClose: () => void }) {
  const me = useMe();
  const update = useUpdateMe();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ SignUp }) => SignUp.pick({ name: true })),
    defaultValues: { name: me.name },
  });
  const submit = handleSubmit(({ name }) => update.mutate({ name }, { onSuccess: onClose }));
  return (
    <Form onSubmit={submit} problem={update.error && sentence(update.error)}>
      <FormField
        control={control}
        name="name"
        label="Name"
        hint="It stands beside what you keep from now on."
        autoComplete="name"
        autoCapitalize="words"
        onSubmitEditing={submit}
      />
      <DialogDecision label="Change the name" busy={update.isPending} onDecide={submit} onClose={onClose} />
    </Form>
  );
}
