import { attempt, limits } from '../auth/limits';
import type { Context } from '../context';

/** Counts a letter that someone has sent to an address, against the sender and against the address. @throws TooMany */
export function countInvitation({ db }: Pick<Context, 'db'>, sender: { readonly id: string }, email: string): void {
  attempt(db, limits.invitationSent, sender.id);
  attempt(db, limits.invitationReceived, email.toLowerCase());
}
