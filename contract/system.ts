import { z } from 'zod';
import { Timestamp } from './common';

export const Health = z.object({ status: z.literal('ok'), engineVersion: z.string(), database: z.literal('ok') }).meta({ id: 'Health' });
export type Health = z.infer<typeof Health>;

/** A message kept by the local mail fake. */
export const DevMail = z
  .object({ to: z.string(), subject: z.string(), text: z.string(), html: z.string(), links: z.array(z.string()), at: Timestamp })
  .meta({ id: 'DevMail' });
export type DevMail = z.infer<typeof DevMail>;
