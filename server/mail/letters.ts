import { writeLetter, type Message } from './message';

interface Addressed {
  readonly name: string;
  readonly email: string;
  readonly url: string;
}

export function verificationLetter({ name, email, url }: Addressed): Message {
  return writeLetter({
    to: email,
    subject: 'Confirm your address for Kerbline',
    before: [
      `Hello ${name},`,
      'please confirm that this address is yours. You can work without it; to be invited into a project you need it.',
    ],
    link: { label: 'Confirm this address', url },
    after: ['The link works for one day. If you did not sign up, do nothing.'],
  });
}

export function resetLetter({ name, email, url }: Addressed): Message {
  return writeLetter({
    to: email,
    subject: 'Choose a new password for Kerbline',
    before: [`Hello ${name},`, 'someone asked to choose a new password for this address.'],
    link: { label: 'Choose a new password', url },
    after: [
      'The link works once, within one hour, and signs out every device. If it was not you, do nothing: your password stays as it is.',
    ],
  });
}
