import { z } from 'zod';

/** Building blocks that every resource shares. Frequencies are rad/s, times s, gains plain factors unless a name says otherwise. */

export const Id = z.uuid().meta({ description: 'UUID made by the server' });
export const Timestamp = z.iso.datetime().meta({ description: 'ISO 8601, UTC' });

/** No control characters, no half characters, nothing that turns the direction of what stands beside it. */
export const ONE_LINE = /^[^\p{Cc}\p{Cs}\u2028\u2029\u202a-\u202e\u2066-\u2069]*$/u;
const SEVERAL_LINES = /^(?:[^\p{Cc}\p{Cs}]|[\n\r\t])*$/u;

export const Name = z
  .string()
  .trim()
  .min(1, 'A name has at least one character.')
  .max(120, 'A name has at most 120 characters.')
  .regex(ONE_LINE, 'A name is one line of text, without control characters.');
export const Note = z
  .string()
  .trim()
  .max(2000, 'A note has at most 2,000 characters.')
  .regex(SEVERAL_LINES, 'A note is text, without control characters.');
export const Revision = z.int().min(1, 'Revisions are counted from 1.');
export const Email = z.email('An e-mail address looks like name@team.example.').max(254).meta({ example: 'name@team.example' });

export const Role = z.enum(['owner', 'editor', 'reviewer', 'viewer']).meta({ id: 'Role' });
export type Role = z.infer<typeof Role>;

export const Verdict = z.enum(['pass', 'tight', 'fail', 'notJudged']).meta({ id: 'Verdict' });
export type Verdict = z.infer<typeof Verdict>;

export const Quantity = z
  .enum([
    'gainMargin',
    'gainReduction',
    'phaseMargin',
    'delayMargin',
    'ms',
    'mt',
    'modulusMargin',
    'diskMargin',
    'noiseGain',
    'bandwidth',
    'riseTime',
    'settlingTime',
    'overshootPercent',
    'undershootPercent',
    'steadyStateError',
    'loadPeak',
    'loadSettlingTime',
    'controlPeak',
  ])
  .meta({ id: 'Quantity', description: 'gainMargin and gainReduction are factors, phaseMargin degrees, delayMargin s' });
export type Quantity = z.infer<typeof Quantity>;

/** Query of every list: `?limit=` and `?cursor=`. */
export const PageQuery = z.object({
  limit: z.coerce.number().int().min(1).max(200).default(50),
  cursor: z
    .string()
    .regex(/^\d{1,15}_[0-9a-f-]{36}$/, 'A cursor is the nextCursor of the list before.')
    .optional(),
});
export type PageQuery = z.infer<typeof PageQuery>;

/** Answer of every list; a cursor holds the sort key and the id of the last item before it. */
export const page = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item), nextCursor: z.string().nullable() });
