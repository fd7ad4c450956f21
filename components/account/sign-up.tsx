import { useLocalSearchParams, useRouter } from 'expo-router';
import { useForm } from 'react-hook-form';
import { safeNext, signInPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { FormField } from '@/components/ui/form-field';
import { Link } from '@/components/ui/link';
import { sentence } from '@/hooks/api/problem';
import { useSignUp } from '@/hooks/queries/session';
import { EntryFrame } from './entry-frame';

export function SignUp() {
  const router = useRouter();
  const { next = '/', email = '' } = useLocalSearchParams<{ next?: string; email?: string }>();
  const signUp = useSignUp();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ SignUp }) => SignUp),
    defaultValues: { name: '', email, password: '' },
  });
  const submit = handleSubmit((values) => signUp.mutate(values, { onSuccess: () => router.replace(safeNext(next)) }));
  return (
    <EntryFrame title="Make an account" lead="Make an account. It works at once, with a team of your own.">
      <Form onSubmit={submit} problem={signUp.error && sentence(signUp.error)}>
        <FormField control={control} name="name" label="Name" autoComplete="name" autoCapitalize="words" onSubmitEditing={submit} />
        <FormField control={control} name="email" label="E-mail" inputMode="email" autoComplete="email" onSubmitEditing={submit} />
        <FormField
          control={control}
          name="password"
          label="Password"
          hint="12 characters or more."
          secureTextEntry
          autoComplete="new-password"
          onSubmitEditing={submit}
        />
        <Button label="Make the account" busyLabel="Making it" kind="primary" tall stretch busy={signUp.isPending} onPress={submit} />
      </Form>
      <Link href={signInPath(next, email)}>Have one? Sign in</Link>
    </EntryFrame>
  );
}
