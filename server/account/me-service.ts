import { defaultPreferences, type Me } from '@/contract';
import type { Database } from '@/db/open';
import { teamsOf } from '@/db/stores/team-store';
import { changeUser, readUser, type UserChange } from '@/db/stores/user-store';

/** The reader's account as the client sees it; preferences nobody chose are the defaults. */
export function readMe(db: Database, userId: string): Me {
  const { id, name, email, emailVerified, preferences } = readUser(db, userId);
  return { id, name, email, emailVerified, teams: teamsOf(db, userId), preferences: { ...defaultPreferences, ...preferences } };
}

export function changeMe(db: Database, userId: string, change: UserChange): Me {
  changeUser(db, userId, change);
  return readMe(db, userId);
}
