import { randomUUID } from 'node:crypto';
import type { ActivityEntry } from '@/db/stores/stamp';

type Action =
  | 'project.created'
  | 'project.changed'
  | 'project.archived'
  | 'project.restored'
  | 'plant.created'
  | 'plant.revised'
  | 'design.created'
  | 'design.revised'
  | 'analysis.kept'
  | 'limits.set'
  | 'case.added'
  | 'case.grid'
  | 'case.changed'
  | 'case.removed'
  | 'member.invited'
  | 'member.added'
  | 'member.joined'
  | 'member.roleChanged'
  | 'member.removed'
  | 'member.left'
  | 'invitation.resent'
  | 'invitation.takenBack';

/** A line of a project's history; `summary` goes on where the person's name stands. */
export const activityEntry = (action: Action, summary: string, detail?: string): ActivityEntry => ({
  id: randomUUID(),
  action,
  summary,
  detail: detail ?? null,
});
