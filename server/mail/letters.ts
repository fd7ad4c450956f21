import type { InvitedRole } from '@/contract';
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

interface Invited {
  readonly email: string;
  readonly project: string;
  readonly invitedBy: string;
  readonly role: InvitedRole;
  readonly url: string;
}

export function invitationLetter({ email, project, invitedBy, role, url, days }: Invited & { readonly days: number }): Message {
  return writeLetter({
    to: email,
    subject: `${invitedBy} invites you to ${project}`,
    before: ['Hello,', `${invitedBy} invites you to the project “${project}” in Kerbline, as ${role}.`],
    link: { label: 'Open the invitation', url },
    after: [`The link works once, for ${days} days, with an account of this address. If you do not know ${invitedBy}, do nothing.`],
  });
}

export function membershipLetter({ email, project, invitedBy, role, url }: Invited): Message {
  return writeLetter({
    to: email,
    subject: `${invitedBy} has made you ${role} of ${project}`,
    before: ['Hello,', `${invitedBy} has made you ${role} of the project “${project}” in Kerbline.`],
    link: { label: 'Open the project', url },
    after: ['If this is not for you, you can leave it on the page of its members.'],
  });
}
