import type { Logger } from 'pino';
import type { Mailer } from './mailer';
import type { Message } from './message';

/**
 * Sends a letter without waiting: a slow mail server must not hold up a request, nor tell by its slowness which addresses are known.
 * What could not be sent is logged.
 */
export function postLetter({ mailer, log }: { readonly mailer: Mailer; readonly log: Logger }, letter: Message): void {
  mailer.send(letter).catch((err: unknown) => log.error({ err, subject: letter.subject }, 'a letter was not sent'));
}
