import { useForm } from 'react-hook-form';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { FormField } from '@/components/ui/form-field';
import { Link } from '@/components/ui/link';
import { sentence } from '@/hooks/api/problem';
import { useAskReset } from '@/hooks/queries/session';
import { EntryFrame } from './entry-frame';

export function ForgotPassword() {
  const reset = useAskReset();
  const { control, handleSubmit } = useForm({ resolver: contractResolver(({ AskReset }) => AskReset), defaultValues: { email: '' } });
  const submit = handleSubmit(({ email }) => reset.mutate(email));
  return (
    <EntryFrame title="Password forgotten" lead="A link to choose a new password comes by e-mail.">
      {reset.isSuccess ? (
        <Banner lead="Look in your mail." text="If there is an account for that address, a link is on its way. It works once." />
      ) : (
        <Form onSubmit={submit} problem={reset.error && sentence(reset.error)}>
          <FormField control={control} name="email" label="E-mail" inputMode="email" autoComplete="email" onSubmitEditing={submit} />
          <Button label="Send the link" busyLabel="Sending" kind="primary" tall stretch busy={reset.isPending} onPress={submit} />
        </Form>
      )}
      <Link href="/sign-in">Back to sign-in</Link>
    </EntryFrame>
  );
}
