import { createTransport } from 'nodemailer';
import type { Database } from '@/db/open';
import { keepMessage } from '@/db/stores/mail-store';
import type { Config } from '../config';
import type { Message } from './message';

export interface Mailer {
  /** Whether messages are kept in the database instead of being sent. */
  readonly fake: boolean;
  readonly send: (message: Message) => Promise<void>;
}

/** Sends by SMTP where a server is named, otherwise keeps every message for GET /api/dev/mail. */
export function createMailer({ smtpUrl, baseUrl }: Config, db: Database): Mailer {
  if (smtpUrl === null) return { fake: true, send: async (message) => keepMessage(db, message) };
  const transport = createTransport(smtpUrl);
  const from = { name: 'Kerbline', address: `no-reply@${new URL(baseUrl).hostname}` };
  return {
    fake: false,
    send: async ({ to, subject, text, html }) => {
      await transport.sendMail({ from, to, subject, text, html });
    },
  };
}
