import { z } from 'zod';
import { ONE_LINE, Quantity, Timestamp } from './common';
import { limitIssues } from './limit-issues';

/** What a project demands: each limit with the target a little inside it, and where it comes from. */

const Source = z
  .string()
  .trim()
  .max(120, 'A source has at most 120 characters.')
  .regex(ONE_LINE, 'A source is one line of text, without control characters.');

export const Limit = z
  .strictObject({
    quantity: Quantity,
    bound: z.enum(['min', 'max']),
    limit: z.number(),
    target: z.number().nullable().default(null).meta({ description: 'null: the default of the quantity, or none where it has none' }),
    source: Source.default(''),
  })
  .meta({ id: 'Limit' });
export type Limit = z.infer<typeof Limit>;

/** Bandwidth and rise time take both bounds, every other quantity one. */
const MOST_LIMITS = 20;

export const PutLimits = z
  .strictObject({ items: z.array(Limit).max(MOST_LIMITS, `At most ${MOST_LIMITS} limits.`) })
  .superRefine(({ items }, context) => {
    for (const { path, message } of limitIssues(items)) context.addIssue({ code: 'custom', path: ['items', ...path], message });
  })
  .meta({ id: 'PutLimits' });
export type PutLimits = z.input<typeof PutLimits>;

export const Limits = z
  .object({
    items: z.array(Limit),
    updatedAt: Timestamp.nullable().meta({ description: 'null while nobody demanded anything' }),
    updatedBy: z.string().nullable(),
  })
  .meta({ id: 'Limits' });
export type Limits = z.infer<typeof Limits>;
