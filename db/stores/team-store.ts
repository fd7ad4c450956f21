import { randomUUID } from 'node:crypto';
import { asc, eq } from 'drizzle-orm';
import type { Database } from '../open';
import { team, teamMember, user } from '../tables';
import { transact } from '../transact';

type Seat = { id: string; name: string; role: 'owner' | 'member' };

/** The teams someone belongs to, the oldest membership first. */
export function teamsOf(db: Database, userId: string): Seat[] {
  return db
    .select({ id: team.id, name: team.name, role: teamMember.role })
    .from(teamMember)
    .innerJoin(team, eq(team.id, teamMember.teamId))
    .where(eq(teamMember.userId, userId))
    .orderBy(asc(teamMember.createdAt))
    .all();
}

/** Gives someone a team of their own unless they are in one already. */
export function ensureTeam(db: Database, userId: string): void {
  transact(db, (within) => {
    if (teamsOf(within, userId).length > 0) return;
    const person = within.select({ name: user.name }).from(user).where(eq(user.id, userId)).get();
    if (!person) return;
    const created = { id: randomUUID(), createdAt: new Date() };
    within
      .insert(team)
      .values({ ...created, name: `${person.name}’s team` })
      .run();
    within.insert(teamMember).values({ teamId: created.id, userId, role: 'owner', createdAt: created.createdAt }).run();
  });
}
