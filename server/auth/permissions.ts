import type { Role } from '@/contract';

/** What may be done in a project, by whom. One table, read by every route and by the test that walks all routes. */
const roles = {
  read: ['owner', 'editor', 'reviewer', 'viewer'],
  edit: ['owner', 'editor'],
  manage: ['owner'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof roles;

export const allows = (role: Role, permission: Permission) => (roles[permission] as readonly Role[]).includes(role);
