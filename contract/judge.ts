import { z } from 'zod';
import { mostCases } from './case';
import { Id, Verdict } from './common';
import { DesignContent } from './design';
import { Headline } from './headline';
import { CaseResult } from './kept-analysis';
import { Room } from './room';

/** Judging without keeping: what these settings would be worth over the project's cases as they stand now. */
export const Judge = DesignContent.extend({
  caseIds: z.array(Id).min(1).max(mostCases).optional().meta({ description: 'all cases of the project where absent' }),
  parts: z.enum(['margins', 'all']).default('margins').meta({ description: 'margins: time responses only where a limit needs them' }),
  room: z.boolean().default(false),
}).meta({ id: 'Judge' });
export type Judge = z.input<typeof Judge>;

export const Judged = z
  .object({ verdict: Verdict, headline: Headline, room: Room.nullable(), results: z.array(CaseResult) })
  .meta({ id: 'Judged' });
export type Judged = z.infer<typeof Judged>;
