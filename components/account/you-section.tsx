import { useState } from 'react';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Heading } from '@/components/ui/text';
import { sentence } from '@/hooks/api/problem';
import { useMe } from '@/hooks/queries/me';
import { useSendVerification } from '@/hooks/queries/session';
import { NameDialog } from './name-dialog';
import { PasswordDialog } from './password-dialog';
import { SettingRow } from './setting-row';

/** Name, address and password. */
export function YouSection() {
  const me = useMe();
  const verification = useSendVerification();
  const [dialog, setDialog] = useState<'name' | 'password' | null>(null);
  const [changed, setChanged] = useState(false);
  const close = () => setDialog(null);
  return (
    <>
      <Heading level={2}>You</Heading>
      <SettingRow name={me.name} about={`${me.email}, ${me.emailVerified ? 'verified' : 'not verified'}`}>
        <Button label="Change" aria-label="Change the name" onPress={() => setDialog('name')} />
      </SettingRow>
      {me.emailVerified ? null : (
        <SettingRow name="Verify the address" about="others can then invite you to their projects">
          <Button label="Send the mail" busyLabel="Sending" busy={verification.isPending} onPress={() => verification.mutate(me.email)} />
        </SettingRow>
      )}
      {verification.isSuccess ? <Banner text={`A link is on its way to ${me.email}.`} /> : null}
      {verification.error ? <Banner text={sentence(verification.error)} /> : null}
      <SettingRow name="Password" about="changing it signs your other devices out">
        <Button label="Change" aria-label="Change the password" onPress={() => setDialog('password')} />
      </SettingRow>
      {changed ? <Banner lead="Password changed." text="Your other devices are signed out." /> : null}
      <NameDialog open={dialog === 'name'} onClose={close} />
      <PasswordDialog
        open={dialog === 'password'}
        onClose={close}
        onChanged={() => {
          setChanged(true);
          close();
        }}
      />
    </>
  );
}
