import type { InviteMember, Role } from '@/contract';

/** The invented team of the demo; the README gives these sign-ins. */
export const demoTeam = 'Heron Racing';
export const demoPassword = 'kerb-and-apex-14';

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  /** In every project of the demo. */
  readonly role: Role;
}

export const engineer: DemoPerson = { name: 'Mira Castellan', email: 'mira@heron-racing.example', role: 'owner' };
export const others: readonly DemoPerson[] = [
  { name: 'Jonas Abara', email: 'jonas@heron-racing.example', role: 'reviewer' },
  { name: 'Tove Lind', email: 'tove@heron-racing.example', role: 'viewer' },
];

/** Has no account yet. */
export const invited: InviteMember = { email: 'rasmus@heron-racing.example', role: 'viewer' };
