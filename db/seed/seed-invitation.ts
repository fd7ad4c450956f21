import { invite } from '@/server/members/invitation-service';
import type { Context } from '@/server/context';
import { listProjects } from '../stores/project-store';
import { invited } from './demo-people';
import type { DemoTeam } from './seed-people';

const HOUR_MS = 3600_000;
/** After everything else that happened in the demo. */
const AGE_MS = 30 * HOUR_MS;

/** Asks someone into the project that was worked on last, who has not answered yet. The letter is not sent: nobody has the address. */
export function seedInvitation(context: Context, { engineer }: DemoTeam): void {
  const { items } = listProjects(context.db, { userId: engineer.id, archived: false }, { limit: 1 });
  invite(context, items[0].id, invited, { by: engineer.id, at: new Date(Date.now() - AGE_MS) });
}
