import { useLocalSearchParams } from 'expo-router';
import { useForm } from 'react-hook-form';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { FormField } from '@/components/ui/form-field';
import { Link } from '@/components/ui/link';
import { sentence } from '@/hooks/api/problem';
import { useResetPassword } from '@/hooks/queries/session';
import { EntryFrame } from './entry-frame';

/** Where the link of a reset mail leads; its token works once. */
export function ResetPassword() {
  const { token } = useLocalSearchParams<{ token?: string }>();
  const reset = useResetPassword();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ ResetPassword }) => ResetPassword),
    defaultValues: { newPassword: '' },
  });
  const submit = handleSubmit(({ newPassword }) => token && reset.mutate({ token, newPassword }));
  if (!token) {
    return (
      <EntryFrame title="New password" lead="This link has ended, or was used before.">
        <Link href="/forgot-password">Send a new link</Link>
      </EntryFrame>
    );
  }
  return (
    <EntryFrame title="New password" lead="Choose a new password. Every device is signed out with it.">
      {reset.isSuccess ? (
        <Banner lead="The password is changed." text="Sign in with it." />
      ) : (
        <Form onSubmit={submit} problem={reset.error && sentence(reset.error)}>
          <FormField
            control={control}
            name="newPassword"
            label="New password"
            hint="12 characters or more."
            secureTextEntry
            autoComplete="new-password"
            onSubmitEditing={submit}
          />
          <Button label="Change the password" busyLabel="Changing it" kind="primary" tall stretch busy={reset.isPending} onPress={submit} />
        </Form>
      )}
      <Link href={reset.isSuccess ? '/sign-in' : '/forgot-password'}>{reset.isSuccess ? 'Sign in' : 'Send a new link'}</Link>
    </EntryFrame>
  );
}
