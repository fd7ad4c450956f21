import { z } from 'zod';
import { Analysis } from './analysis';
import { CaseAxes, CaseParameters } from './case';
import { Id, Quantity, Revision, Timestamp, Verdict } from './common';
import { Controller } from './controller';
import { Actuator, Sampling } from './loop';
import { KeptPlant } from './plant';
import { Headline } from './project';

/** A frozen result: this design revision over these cases against these limits, by this engine. */

export const Limit = z
  .object({ quantity: Quantity, bound: z.enum(['min', 'max']), limit: z.number(), target: z.number().nullable(), source: z.string() })
  .meta({ id: 'Limit' });
export type Limit = z.infer<typeof Limit>;

export const Check = z
  .object({
    quantity: Quantity,
    bound: z.enum(['min', 'max']),
    limit: z.number(),
    target: z.number().nullable(),
    value: z.number().nullable(),
    use: z.number().nullable(),
    verdict: Verdict,
  })
  .meta({ id: 'Check' });
export type Check = z.infer<typeof Check>;

export const FrozenCase = z.object({
  id: Id,
  name: z.string(),
  plant: KeptPlant.extend({ id: Id, name: z.string(), revision: z.int() }),
  parameters: CaseParameters,
  axes: CaseAxes,
});
export type FrozenCase = z.infer<typeof FrozenCase>;

export const FrozenInputs = z
  .object({
    design: z.object({
      id: Id,
      name: z.string(),
      revision: z.int(),
      controller: Controller,
      sampling: z.union([Sampling, z.literal('continuous')]).nullable(),
      actuator: Actuator.nullable(),
    }),
    cases: z.array(FrozenCase),
    limits: z.array(Limit),
  })
  .meta({ id: 'FrozenInputs' });
export type FrozenInputs = z.infer<typeof FrozenInputs>;

export const CaseResult = z
  .object({
    case: z.object({ id: Id, name: z.string() }),
    verdict: Verdict,
    reason: z.string().nullable().meta({ description: 'why it is not judged' }),
    checks: z.array(Check),
    numbers: Analysis,
  })
  .meta({ id: 'CaseResult' });
export type CaseResult = z.infer<typeof CaseResult>;

export const AnalysisSummary = z
  .object({
    id: Id,
    design: z.object({ id: Id, name: z.string(), revision: z.int() }),
    engineVersion: z.string(),
    contentHash: z.string(),
    resultHash: z.string(),
    createdAt: Timestamp,
    createdBy: z.string(),
    verdict: Verdict,
    headline: Headline,
    room: z.null().meta({ description: 'null while no limits are demanded' }),
    caseCount: z.int(),
    plants: z.array(z.object({ id: Id, name: z.string(), revision: z.int() })),
  })
  .meta({ id: 'AnalysisSummary' });
export type AnalysisSummary = z.infer<typeof AnalysisSummary>;

export const KeptAnalysis = AnalysisSummary.extend({ inputs: FrozenInputs, results: z.array(CaseResult) }).meta({ id: 'KeptAnalysis' });
export type KeptAnalysis = z.infer<typeof KeptAnalysis>;

export const CreateAnalysis = z
  .strictObject({ designId: Id, designRevision: Revision.optional(), caseIds: z.array(Id).min(1).max(400).optional() })
  .meta({ id: 'CreateAnalysis' });
export type CreateAnalysis = z.infer<typeof CreateAnalysis>;

export const Recomputed = z
  .object({
    same: z.boolean(),
    engineVersion: z.string(),
    resultHash: z.string(),
    differences: z.array(z.object({ case: z.string(), quantity: z.string(), kept: z.number().nullable(), now: z.number().nullable() })),
  })
  .meta({ id: 'Recomputed' });
export type Recomputed = z.infer<typeof Recomputed>;
