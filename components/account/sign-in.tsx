import { useLocalSearchParams, useRouter } from 'expo-router';
import { useForm } from 'react-hook-form';
import { View } from 'react-native';
import { safeNext, signUpPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { FormField } from '@/components/ui/form-field';
import { Link } from '@/components/ui/link';
import { Text } from '@/components/ui/text';
import { hasStatus, sentence } from '@/hooks/api/problem';
import { useSignIn } from '@/hooks/queries/session';
import { EntryFrame } from './entry-frame';

const refusal = (error: unknown) => (hasStatus(error, 401) ? 'That e-mail and password do not match.' : sentence(error));

export function SignIn() {
  const router = useRouter();
  const { next = '/', email = '' } = useLocalSearchParams<{ next?: string; email?: string }>();
  const signIn = useSignIn();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ SignIn }) => SignIn),
    defaultValues: { email, password: '' },
  });
  const submit = handleSubmit((values) => signIn.mutate(values, { onSuccess: () => router.replace(safeNext(next)) }));
  return (
    <EntryFrame title="Sign in" lead="How far is the loop from the edge, before the car leaves the garage?">
      <Form onSubmit={submit} problem={signIn.error && refusal(signIn.error)}>
        <FormField control={control} name="email" label="E-mail" inputMode="email" autoComplete="email" onSubmitEditing={submit} />
        <FormField
          control={control}
          name="password"
          label="Password"
          secureTextEntry
          autoComplete="current-password"
          onSubmitEditing={submit}
        />
        <Button label="Sign in" busyLabel="Signing in" kind="primary" tall stretch busy={signIn.isPending} onPress={submit} />
      </Form>
      <View>
        <Link href={signUpPath(next, email)}>New here? Make an account</Link>
        <Link href="/forgot-password">Password forgotten</Link>
      </View>
      <Text step="note" tone="ink2">
        An account works at once, with a team of your own.
      </Text>
    </EntryFrame>
  );
}
