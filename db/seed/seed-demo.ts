import type { Context } from '@/server/context';
import { user } from '../tables';
import { demoProjects } from './demo-projects';
import { seedInvitation } from './seed-invitation';
import { seedPeople } from './seed-people';
import { seedProject } from './seed-project';

const TEAM_AGE_MS = 60 * 24 * 3600_000;

/** Fills an empty database with the demo team and its work; leaves any other as it is. */
export async function seedDemo(context: Context): Promise<void> {
  if (context.db.select({ id: user.id }).from(user).limit(1).get()) return;
  const people = await seedPeople(context, new Date(Date.now() - TEAM_AGE_MS));
  for (const demo of demoProjects) await seedProject(context, people, demo);
  seedInvitation(context, people);
  context.log.info('The demo team is in place');
}
