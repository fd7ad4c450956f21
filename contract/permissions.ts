import type { Role } from './common';

interface Grant {
  /** What it lets a member do, as the members' page says it. */
  readonly words: string;
  /** The same beside a name, in two or three words. */
  readonly brief: string;
  readonly roles: readonly Role[];
}

/**
 * Who may do what in a project. The only such table: routes name its permissions, the members' page shows it, and the
 * authorisation test walks every route by it.
 */
export const permissions = {
  read: {
    words: 'Open everything in the project, see who its members are, try gains on the bench, leave',
    brief: 'read',
    roles: ['owner', 'editor', 'reviewer', 'viewer'],
  },
  edit: {
    words: 'Enter and change plants, designs, cases and limits, keep analyses, rename the project',
    brief: 'change and keep',
    roles: ['owner', 'editor'],
  },
  review: {
    words: 'Be asked for a review; sign a design that someone else made, or send it back',
    brief: 'sign or send back',
    roles: ['reviewer'],
  },
  manage: {
    words: 'Invite members and see their addresses, give and take roles, archive and delete the project',
    brief: 'manage people and the project',
    roles: ['owner'],
  },
} as const satisfies Record<string, Grant>;

export type Permission = keyof typeof permissions;

export const allows = (role: Role, permission: Permission): boolean => (permissions[permission].roles as readonly Role[]).includes(role);
