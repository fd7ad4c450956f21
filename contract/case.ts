import { z } from 'zod';
import { Id, Revision } from './common';

export const CaseParameters = z.strictObject({
  gainFactor: z
    .number()
    .refine((x) => Number.isFinite(x) && x !== 0, 'A gain factor is not zero.')
    .optional(),
  deadTime: z.number().min(0, 'Dead time is 0 or more.').max(1e4, 'Dead time is at most 10,000 s.').optional(),
});
export type CaseParameters = z.infer<typeof CaseParameters>;
export const CaseAxes = z.strictObject({ speed: z.number().optional(), mass: z.number().optional(), grade: z.number().optional() });

/** One condition the loop must survive. */
export const Case = z
  .object({
    id: Id,
    name: z.string(),
    plantId: Id,
    plantRevision: Revision.nullable().meta({ description: 'null: the latest' }),
    parameters: CaseParameters,
    axes: CaseAxes,
  })
  .meta({ id: 'Case' });
export type Case = z.infer<typeof Case>;
