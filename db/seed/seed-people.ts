import { randomUUID } from 'node:crypto';
import { defaultPreferences } from '@/contract';
import type { Context } from '@/server/context';
import { changeUser } from '../stores/user-store';
import { team, teamMember } from '../tables';
import { transact } from '../transact';
import { demoPassword, demoTeam, engineer, others, type DemoPerson } from './demo-people';

export interface DemoUser extends DemoPerson {
  readonly id: string;
}

export interface DemoTeam {
  readonly teamId: string;
  readonly engineer: DemoUser;
  readonly others: readonly DemoUser[];
}

/** Straight into better-auth's tables: a sign-up would send a mail to an address that nobody has. */
async function createAccount({ auth, db }: Context, person: DemoPerson, at: Date): Promise<DemoUser> {
  const { internalAdapter, password } = await auth.$context;
  const profile = { name: person.name, email: person.email, emailVerified: true, createdAt: at };
  const { id } = await internalAdapter.createUser(profile, { method: 'email-password' });
  await internalAdapter.linkAccount({ userId: id, accountId: id, providerId: 'credential', password: await password.hash(demoPassword) });
  // The demo's speeds are whole numbers of km/h.
  changeUser(db, id, { preferences: { ...defaultPreferences, speedUnit: 'km/h' } });
  return { ...person, id };
}

/** Makes the demo's people with verified addresses, all in one team that the engineer owns. */
export async function seedPeople(context: Context, at: Date): Promise<DemoTeam> {
  const owner = await createAccount(context, engineer, at);
  const members = await Promise.all(others.map((person) => createAccount(context, person, at)));
  const teamId = randomUUID();
  transact(context.db, (within) => {
    within.insert(team).values({ id: teamId, name: demoTeam, createdAt: at }).run();
    const seats = [{ userId: owner.id, role: 'owner' as const }, ...members.map(({ id }) => ({ userId: id, role: 'member' as const }))];
    within
      .insert(teamMember)
      .values(seats.map((seat) => ({ ...seat, teamId, createdAt: at })))
      .run();
  });
  return { teamId, engineer: owner, others: members };
}
