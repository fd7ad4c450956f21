import { request, type APIRequestContext } from 'playwright-core';

export interface SecondPerson {
  readonly api: APIRequestContext;
  readonly end: () => Promise<void>;
}

/** Someone else at a device of their own, who works through the API while the page is looked at. */
export async function secondPerson(url: string, person: { email: string; password: string }): Promise<SecondPerson> {
  const api = await request.newContext({ baseURL: url, extraHTTPHeaders: { origin: url } });
  const answer = await api.post('/api/auth/sign-in/email', { data: person });
  if (!answer.ok()) throw new Error(`sign-in answered ${answer.status()}: ${await answer.text()}`);
  return { api, end: () => api.dispose() };
}

interface Seat {
  readonly userId: string;
  readonly email: string | null;
  readonly etag: string;
}

/** Gives a member of a project a role, as its owner. */
export async function giveRole(
  owner: APIRequestContext,
  url: string,
  { project, email, role }: Record<'project' | 'email' | 'role', string>,
) {
  const { items } = (await (await owner.get(`${url}/api/projects/${project}/members`)).json()) as { items: Seat[] };
  const seat = items.find((item) => item.email === email);
  if (!seat) throw new Error(`${email} is no member.`);
  const headers = { origin: url, 'if-match': seat.etag };
  const answer = await owner.patch(`${url}/api/projects/${project}/members/${seat.userId}`, { data: { role }, headers });
  if (!answer.ok()) throw new Error(`PATCH member answered ${answer.status()}: ${await answer.text()}`);
}
