import { z } from 'zod';
import { Analysis } from './analysis';
import { CaseAxes, CaseBasis, CaseParameters, mostCases } from './case';
import { Id, Quantity, Revision, Timestamp, Verdict } from './common';
import { Controller } from './controller';
import { Limit } from './limits';
import { Actuator, Sampling } from './loop';
import { KeptPlant } from './plant';
import { OperatingRange } from './operating-range';
import { CaseRef, Headline } from './headline';
import { Room } from './room';

/** A frozen result: this design revision over these cases against these limits, by this engine. */

export const Check = z
  .object({
    quantity: Quantity,
    bound: z.enum(['min', 'max']),
    limit: z.number(),
    target: z.number().nullable().meta({ description: 'the target judged against, the default where none was named; null: none' }),
    value: z.number().nullable(),
    use: z.number().nullable(),
    verdict: Verdict,
  })
  .meta({ id: 'Check' });
export type Check = z.infer<typeof Check>;

export const FrozenCase = z.object({
  id: Id,
  name: z.string(),
  plant: KeptPlant.extend({ id: Id, name: z.string(), revision: z.int() }).meta({
    description: 'with the case’s own values of a formula’s parameters, and what the formula reads as with them',
  }),
  parameters: CaseParameters,
  axes: CaseAxes,
  basis: CaseBasis,
});
export type FrozenCase = z.infer<typeof FrozenCase>;

/** What every design of the project is judged against, as it stands now or stood when it was frozen. */
export const Conditions = z
  .object({ cases: z.array(FrozenCase), limits: z.array(Limit), operatingRange: z.array(OperatingRange) })
  .meta({ id: 'Conditions' });
export type Conditions = z.infer<typeof Conditions>;

export const FrozenInputs = Conditions.extend({
  design: z.object({
    id: Id,
    name: z.string(),
    revision: z.int(),
    controller: Controller,
    sampling: z.union([Sampling, z.literal('continuous')]).nullable(),
    actuator: Actuator.nullable(),
  }),
}).meta({ id: 'FrozenInputs' });
export type FrozenInputs = z.infer<typeof FrozenInputs>;

export const CaseResult = z
  .object({
    case: CaseRef,
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
    room: Room.nullable().meta({ description: 'null in an analysis that was kept without it' }),
    caseCount: z.int(),
    plants: z.array(z.object({ id: Id, name: z.string(), revision: z.int() })),
  })
  .meta({ id: 'AnalysisSummary' });
export type AnalysisSummary = z.infer<typeof AnalysisSummary>;

export const KeptAnalysis = AnalysisSummary.extend({ inputs: FrozenInputs, results: z.array(CaseResult) }).meta({ id: 'KeptAnalysis' });
export type KeptAnalysis = z.infer<typeof KeptAnalysis>;

export const CreateAnalysis = z
  .strictObject({ designId: Id, designRevision: Revision.optional(), caseIds: z.array(Id).min(1).max(mostCases).optional() })
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
