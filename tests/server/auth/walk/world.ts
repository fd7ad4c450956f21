import type { InvitedRole, Me, Project, Role } from '@/contract';
import { rateLimit } from '@/db/tables';
import { made, makeProject } from '../../../support/a-project';
import { createClient, type Client } from '../../../support/client';
import { addTo, idOf, invite, verified } from '../../../support/members';
import type { TestApp } from '../../../support/test-app';
import type { Ids } from './row';

/** Who tries every route. `rival` owns another team's project, `removed` was taken out, `ghost` owned a project that is deleted. */
export const memberRoles: readonly Role[] = ['owner', 'editor', 'reviewer', 'viewer'];
export const strangers = ['rival', 'removed', 'ghost'] as const;
export type Actor = 'nobody' | Role | (typeof strangers)[number];

export interface World {
  readonly app: TestApp;
  readonly cast: Readonly<Record<Actor | 'spare', Client>>;
  /** The project that the roles are in, with one thing of each kind. */
  readonly ours: Ids;
  /** Another team's. */
  readonly theirs: Ids;
  /** What was there before its project was deleted. */
  readonly gone: Ids;
  /** The account that rows put into the project and take out again. */
  readonly spareId: string;
  readonly forgetLimits: () => void;
}

async function sessionOf(client: Client): Promise<string> {
  const { body } = await client.call<{ items: { id: string; current: boolean }[] }>('GET', '/api/me/sessions');
  return body.items.find(({ current }) => current)!.id;
}

/** A computation of this person that is over. */
export async function finishedJob({ context }: TestApp, owner: string, ids: Ids): Promise<string> {
  const result = { projectId: ids.projectId, analysisId: ids.analysisId };
  const posted = context.board.post({ owner, kind: 'analysis', total: 1, work: async () => result });
  await posted.within(1_000);
  return posted.now().id;
}

/** A project of this owner with one thing of every kind that has an id. */
export async function everything(app: TestApp, owner: Client): Promise<Ids> {
  const { at, project, plant, design } = await makeProject(owner);
  const cases = await owner.call<{ items: { id: string }[] }>('GET', `${at}/cases`);
  const analysis = await made<{ id: string }>(owner, `${at}/analyses`, { designId: design.id });
  const invitation = await invite(owner, at, { email: `guest-of-${owner.name}@team.example` }, 'viewer');
  const me = await owner.call<Me>('GET', '/api/me');
  const ids = {
    projectId: project.id,
    plantId: plant.id,
    designId: design.id,
    caseId: cases.body.items[0].id,
    analysisId: analysis.id,
    userId: me.body.id,
    invitationId: invitation.body.id,
    teamId: me.body.teams[0].id,
    sessionId: await sessionOf(owner),
  };
  return { ...ids, jobId: await finishedJob(app, me.body.id, ids) };
}

async function deletedProject(app: TestApp, owner: Client): Promise<Ids> {
  const ids = await everything(app, owner);
  const at = `/api/projects/${ids.projectId}`;
  const { body } = await owner.call<Project>('GET', at);
  await owner.call('DELETE', at, { confirmName: body.name }, { 'if-match': '*' });
  return ids;
}

/** Everyone with the project of their own, made through the API. */
export async function makeWorld(app: TestApp): Promise<World> {
  const forgetLimits = () => void app.db.delete(rateLimit).run();
  const names = [...memberRoles, ...strangers, 'spare'] as const;
  const people = await Promise.all(names.map((name) => verified(app, name)));
  const cast = { nobody: app.client('nobody'), ...Object.fromEntries(people.map((client) => [client.name, client])) } as World['cast'];
  const ours = await everything(app, cast.owner);
  const at = `/api/projects/${ours.projectId}`;
  for (const role of memberRoles.slice(1)) await addTo(cast.owner, at, cast[role as InvitedRole], role);
  const removedId = await addTo(cast.owner, at, cast.removed, 'editor');
  await cast.owner.call('DELETE', `${at}/members/${removedId}`, undefined, { 'if-match': '*' });
  forgetLimits();
  return {
    app,
    cast,
    ours: { ...ours, userId: await idOf(cast.viewer) },
    theirs: await everything(app, cast.rival),
    gone: await deletedProject(app, cast.ghost),
    spareId: await idOf(cast.spare),
    forgetLimits,
  };
}

/** The same people, signed in as they are, at another server over the same database. */
export function elsewhere(world: World, url: string): World {
  const moved = Object.entries(world.cast).map(([name, { cookie }]) => [name, Object.assign(createClient(url, name), { cookie })] as const);
  return { ...world, cast: Object.fromEntries(moved) as World['cast'] };
}
