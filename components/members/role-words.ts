import type { Role } from '@/contract';
import { allows, type Permission, permissions } from '@/contract/permissions';

const names = Object.keys(permissions) as Permission[];

/** What a role lets someone do, in a few words, from the one table. */
export const roleWords = (role: Role): string =>
  names
    .filter((permission) => allows(role, permission))
    .map((permission) => permissions[permission].brief)
    .join(', ');
