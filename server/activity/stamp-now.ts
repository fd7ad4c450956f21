import type { Stamp } from '@/db/stores/stamp';

/** Who is writing, at this moment. */
export const stampNow = (user: { readonly id: string }): Stamp => ({ by: user.id, at: new Date() });
