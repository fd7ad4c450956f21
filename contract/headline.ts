import { z } from 'zod';
import { Axis } from './case';
import { Id, Quantity, Verdict } from './common';

export const CaseRef = z.object({ id: Id, name: z.string() });
export type CaseRef = z.infer<typeof CaseRef>;

/** A check that stands beside the headline: a failed performance quantity, or where the overall verdict comes from. */
export const Beside = z
  .object({
    quantity: Quantity,
    value: z.number().nullable(),
    limit: z.number(),
    use: z.number().nullable(),
    verdict: Verdict,
    case: CaseRef,
    frequency: z.number().nullable(),
  })
  .meta({ id: 'Beside' });
export type Beside = z.infer<typeof Beside>;

/** An end of an axis at which a case stands: nothing beyond it was checked. */
export const Edge = z
  .object({
    axis: Axis,
    end: z.enum(['low', 'high']),
    physical: z.boolean().meta({ description: 'declared: nothing beyond it can happen' }),
  })
  .meta({ id: 'Edge' });
export type Edge = z.infer<typeof Edge>;

/** The number that stands first: the worst over the cases of the newest analysis. */
export const Headline = z
  .object({
    quantity: Quantity,
    value: z.number().nullable(),
    verdict: Verdict.meta({ description: 'of all cases together' }),
    case: CaseRef.nullable(),
    frequency: z.number().nullable(),
    limit: z.number().nullable(),
    target: z.number().nullable().meta({ description: 'the target that it was judged against; null where there is none' }),
    use: z.number().nullable(),
    unstableCases: z.int().meta({ description: 'cases whose closed loop is not stable' }),
    reason: z.string().nullable().meta({ description: 'why it is not judged' }),
    beside: Beside.nullable(),
    edges: z.array(Edge).meta({ description: 'ends of axes at which the headline’s case stands' }),
    capped: z.boolean().meta({ description: 'tight only because the case stands at an end that is not declared physical' }),
  })
  .meta({ id: 'Headline' });
export type Headline = z.infer<typeof Headline>;
