import { randomUUID } from 'node:crypto';
import { allows, type Role } from '@/contract';
import { attemptOf, says, send, withId, type Attempt } from './attempt';
import { digest } from './digest';
import type { Operation } from './operations';
import type { Ids, Row } from './row';
import { memberRoles, strangers, type Actor, type World } from './world';

/** One route on its way through everyone who may and may not call it. */
interface Walk {
  readonly world: World;
  readonly operation: Operation;
  readonly row: Row;
  /** What was wrong, a line each. */
  readonly findings: string[];
}

const everyone: readonly Actor[] = [...memberRoles, ...strangers];
const isMember = (actor: Actor): actor is Role => (memberRoles as readonly Actor[]).includes(actor);

/** The status that someone must be refused with; null where they must be let through. */
function refusal({ needs }: Row, actor: Actor): number | null {
  if (needs === 'public') return null;
  if (actor === 'nobody') return 401;
  if (needs === 'session') return null;
  if (!isMember(actor)) return 404;
  return allows(actor, needs) ? null : 403;
}

/** Fields that someone might hope to set. */
const forbiddenFields = { role: 'owner', ownerId: randomUUID(), createdAt: '2020-01-01T00:00:00.000Z', id: randomUUID() };

async function expectStatus({ operation, row, findings }: Walk, who: string, attempt: Attempt, wanted: readonly number[]): Promise<void> {
  const { status, text } = await send(operation, row, attempt);
  if (!wanted.includes(status)) findings.push(`${who}: ${status}, wanted ${wanted.join(' or ')}. ${text.slice(0, 200)}`);
}

/** Somebody else's thing must be answered as one that never was, to the letter. */
async function expectNoHint({ operation, row, findings }: Walk, what: string, foreign: Attempt, unknown: Attempt): Promise<void> {
  const [one, other] = [await send(operation, row, foreign), await send(operation, row, unknown)];
  if (one.status !== 404) findings.push(`${what}: ${one.status}, wanted 404. ${one.text.slice(0, 200)}`);
  if (one.text !== other.text || one.headers.has('etag')) findings.push(`${what} is told apart from nothing: ${one.text} | ${other.text}`);
}

async function refuseStrangers(walk: Walk, prepared: Ids): Promise<void> {
  const { world, operation, row } = walk;
  for (const actor of [...strangers, ...memberRoles, 'nobody'] as const) {
    const status = refusal(row, actor);
    if (status === null) continue;
    const attempt = attemptOf(row, world.cast[actor], actor === 'ghost' ? world.gone : prepared);
    await expectStatus(walk, actor, attempt, [status]);
    if (status !== 404) continue;
    const nothing = Object.fromEntries(operation.pathIds.map((name) => [name, randomUUID()]));
    await expectNoHint(walk, actor, attempt, { ...attempt, ids: nothing });
  }
}

async function refuseForeignIds(walk: Walk, mine: Attempt): Promise<void> {
  const { world, operation, findings } = walk;
  for (const name of operation.pathIds) {
    if (!world.theirs[name]) findings.push(`nobody else has a ${name}: give the world one`);
    const swapped = (id: string) => ({ ...mine, ids: { ...mine.ids, [name]: id } });
    await expectNoHint(walk, `someone else’s ${name}`, swapped(world.theirs[name]), swapped(randomUUID()));
  }
  for (const field of operation.bodyIds) {
    const foreign = world.theirs[field.replace(/Ids$/, 'Id')];
    if (!foreign) findings.push(`nobody else has a ${field}: give the world one`);
    if (!says(mine.body, field)) findings.push(`the row’s body leaves ${field} out`);
    const swapped = (id: string) => ({ ...mine, body: withId(mine.body, field, id) });
    await expectNoHint(walk, `someone else’s ${field} in the body`, swapped(foreign), swapped(randomUUID()));
  }
}

async function refuseExtraFields(walk: Walk, mine: Attempt): Promise<void> {
  const { fields } = walk.operation;
  if (fields === null) return;
  for (const [field, value] of Object.entries(forbiddenFields)) {
    if (fields.includes(field)) continue;
    await expectStatus(walk, `with an extra ${field}`, { ...mine, body: { ...(mine.body as object), [field]: value } }, [400]);
  }
}

const mayCall = (row: Row): readonly Actor[] =>
  row.needs === 'public' ? ['nobody'] : everyone.filter((actor) => refusal(row, actor) === null);

const readyFor = async (world: World, row: Row, actor: Actor): Promise<Ids> => ({
  ...world.ours,
  ...(await row.prepare?.(world, world.cast[actor])),
});

/** Tries everything that a route must refuse, which must change nothing. Answers what it found, nothing where all is well. */
export async function turnsAway(world: World, operation: Operation, row: Row): Promise<string[]> {
  const way: Walk = { world, operation, row, findings: [] };
  world.forgetLimits();
  const [someone] = mayCall(row);
  const prepared = await readyFor(world, row, someone);
  const before = digest(world.app);
  await refuseStrangers(way, prepared);
  const mine = attemptOf(row, world.cast[someone], prepared);
  await refuseForeignIds(way, mine);
  await refuseExtraFields(way, mine);
  if (digest(world.app) !== before) way.findings.push('something was changed by a call that had to be refused');
  return way.findings;
}

/** Calls a route rightly, as everyone who may. Answers who was not let in. */
export async function letsIn(world: World, operation: Operation, row: Row): Promise<string[]> {
  const way: Walk = { world, operation, row, findings: [] };
  world.forgetLimits();
  for (const actor of row.slow ? mayCall(row).slice(0, 1) : mayCall(row)) {
    const attempt = attemptOf(row, world.cast[actor], await readyFor(world, row, actor));
    await expectStatus(way, actor, attempt, operation.successes);
  }
  return way.findings;
}
