import { allows, type Member, type PageQuery, type Role } from '@/contract';
import type { Database } from '@/db/open';
import {
  changeRole,
  findMember,
  listMembers,
  removeMember,
  type KeptMember,
  type MemberKey,
  type SeatOutcome,
} from '@/db/stores/member-store';
import type { Page } from '@/db/stores/keyset';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import { changedMeanwhile, etagOf } from '../http/etag';
import { Conflict, NotAllowed, NotFound } from '../http/problem';
import type { ProjectSeat } from '../http/route';

/** Who is looking, and from which seat. */
export interface Reader {
  readonly userId: string;
  readonly seat: ProjectSeat;
}

function toMember({ version, since, email, ...member }: KeptMember, { userId, seat }: Reader): Member {
  const shown = member.userId === userId || allows(seat.role, 'manage');
  return { ...member, email: shown ? email : null, since: since.toISOString(), etag: etagOf(version) };
}

export function membersOf(db: Database, reader: Reader, page: PageQuery): Page<Member> {
  const { items, nextCursor } = listMembers(db, reader.seat.id, page);
  return { items: items.map((member) => toMember(member, reader)), nextCursor };
}

function readMember(db: Database, key: MemberKey): KeptMember {
  const member = findMember(db, key);
  if (!member) throw new NotFound();
  return member;
}

/** @throws NotFound */
export const openMember = (db: Database, key: MemberKey, reader: Reader): Member => toMember(readMember(db, key), reader);

function settle(outcome: SeatOutcome): void {
  if (outcome === 'stale') throw changedMeanwhile();
  if (outcome === 'lastOwner')
    throw new Conflict('This is the last owner, and a project always has one. Make someone else an owner first.');
}

interface Change {
  readonly key: MemberKey;
  readonly reader: Reader;
  readonly expectVersion: (version: number) => void;
  readonly stamp: Stamp;
}

/** Gives a member another role, from the next request on. @throws NotFound, Problem 412 or 428, Conflict for the last owner */
export function giveRole(db: Database, { key, reader, expectVersion, stamp }: Change, role: Role): Member {
  const { version, name, role: before } = readMember(db, key);
  expectVersion(version);
  const activity = activityEntry('member.roleChanged', `made ${name} ${role} instead of ${before}`);
  settle(changeRole(db, { ...key, version, activity, stamp }, role));
  return openMember(db, key, reader);
}

/**
 * Takes a member out, or lets the caller leave.
 * @throws NotAllowed where it is someone else and the caller does not manage members; NotFound, Problem 412 or 428; Conflict for the last owner
 */
export function endMembership(db: Database, { key, reader, expectVersion, stamp }: Change): void {
  const leaves = key.userId === reader.userId;
  if (!leaves && !allows(reader.seat.role, 'manage')) throw new NotAllowed();
  const { version, name } = readMember(db, key);
  expectVersion(version);
  const activity = leaves ? activityEntry('member.left', 'left the project') : activityEntry('member.removed', `took ${name} out`);
  settle(removeMember(db, { ...key, version, activity, stamp }));
}
