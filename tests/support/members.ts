import type { Invitation, Me, Member, Role } from '@/contract';
import type { Client } from './client';
import { mailedLink } from './mail';
import type { TestApp } from './test-app';

/** Follows the link of the newest mail to this person, which must be the one that confirms their address. */
export async function confirmAddress(app: TestApp, { email }: Client): Promise<void> {
  const link = await mailedLink(app, email);
  const { headers } = await app.client('mail reader').call('GET', link.pathname + link.search);
  if (headers.get('location') !== '/verified') throw new Error(`${link} does not confirm an address.`);
}

/** An account whose address is confirmed. */
export async function verified(app: TestApp, name: string): Promise<Client> {
  const client = await app.client(name).signUp();
  await confirmAddress(app, client);
  return client;
}

export const idOf = async (client: Client): Promise<string> => (await client.call<Me>('GET', '/api/me')).body.id;

/** @param at `/api/projects/<id>` */
export const invite = (owner: Client, at: string, { email }: Pick<Client, 'email'>, role: Role) =>
  owner.call<Invitation>('POST', `${at}/members`, { email, role });

export const membersAt = async (client: Client, at: string): Promise<Member[]> =>
  (await client.call<{ items: Member[] }>('GET', `${at}/members`)).body.items;

export const invitationsAt = async (owner: Client, at: string): Promise<Invitation[]> =>
  (await owner.call<{ items: Invitation[] }>('GET', `${at}/invitations`)).body.items;

/** Makes a member of someone whose address is confirmed, with any role. */
export async function addTo(owner: Client, at: string, person: Client, role: Role): Promise<string> {
  const userId = await idOf(person);
  await invite(owner, at, person, role === 'owner' ? 'editor' : role);
  if (role === 'owner') await owner.call('PATCH', `${at}/members/${userId}`, { role }, { 'if-match': '*' });
  return userId;
}
