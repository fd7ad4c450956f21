import type { DevMail } from '@/contract';
import type { TestApp } from './test-app';

/** The newest message that the local mail fake kept for an address. */
export async function newestMail(app: TestApp, to: string): Promise<DevMail> {
  const { body } = await app.client('mail reader').call<{ items: DevMail[] }>('GET', `/api/dev/mail?to=${encodeURIComponent(to)}`);
  if (body.items.length === 0) throw new Error(`No mail was kept for ${to}.`);
  return body.items[0];
}

/** The link in that message. */
export async function mailedLink(app: TestApp, to: string): Promise<URL> {
  return new URL((await newestMail(app, to)).links[0]);
}
