import { z } from 'zod';
import { Id, Name, Note, Revision, Timestamp } from './common';
import { Controller } from './controller';
import { Actuator, Sampling } from './loop';
import { KeptAnalysis } from './kept-analysis';

const content = {
  controller: Controller,
  sampling: z
    .union([Sampling, z.literal('continuous')])
    .nullable()
    .default(null)
    .meta({ description: '"continuous" where someone states it; null: nobody said' }),
  actuator: Actuator.nullable().default(null),
};

export const DesignContent = z.strictObject(content);
export type DesignContent = z.infer<typeof DesignContent>;

export const CreateDesign = z.strictObject({ name: Name, ...content, note: Note.optional() }).meta({ id: 'CreateDesign' });
export type CreateDesign = z.input<typeof CreateDesign>;
export const ReviseDesign = z
  .strictObject({ name: Name.optional(), ...content, note: Note.optional(), baseRevision: Revision, analyse: z.boolean().default(false) })
  .meta({ id: 'ReviseDesign' });
export type ReviseDesign = z.input<typeof ReviseDesign>;

export const DesignRevision = z
  .object({
    id: Id,
    name: z.string(),
    revision: z.int(),
    ...content,
    note: z.string().nullable(),
    createdAt: Timestamp,
    createdBy: z.string(),
    authorId: z.string(),
  })
  .meta({ id: 'DesignRevision', description: "id is the design's" });
export type DesignRevision = z.infer<typeof DesignRevision>;

export const RevisedDesign = DesignRevision.extend({ analysis: KeptAnalysis.optional() }).meta({ id: 'RevisedDesign' });
export type RevisedDesign = z.infer<typeof RevisedDesign>;
