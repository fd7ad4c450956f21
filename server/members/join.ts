import type { Database } from '@/db/open';
import { joinInvited } from '@/db/stores/joining-store';
import { activityEntry } from '../activity/activity-entry';

/** What is written when someone joins now. */
export const joined = (userId: string) => ({
  userId,
  at: new Date(),
  entryFor: (role: string) => activityEntry('member.joined', `joined as ${role}`),
});

/** Makes memberships of the invitations that waited for this person's confirmed address. */
export const joinWhereInvited = (db: Database, userId: string): void => joinInvited(db, joined(userId));
