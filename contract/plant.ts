import { z } from 'zod';
import { Id, Name, Note, ONE_LINE, Revision, Timestamp } from './common';
import { PlantModel, PlantReading, Sensor } from './plant-model';

const Seconds = z.number().min(0, 'A delay is 0 or more.').max(1e4);
export const DelayRow = z
  .strictObject({ source: Name, nominal: Seconds, worst: Seconds, basis: z.enum(['measured', 'assumed']), included: z.boolean() })
  .meta({ id: 'DelayRow' });

const Unit = z.string().trim().max(20, 'A unit has at most 20 characters.').regex(ONE_LINE, 'A unit is one line of text.');

const content = {
  plant: PlantModel,
  sensor: Sensor.nullable().default(null),
  deadTimeBasis: z.enum(['measured', 'assumed']).nullable().default(null).meta({ description: 'null: nobody said' }),
  delayBudget: z.array(DelayRow).max(20, 'At most 20 rows.').default([]),
  units: z.strictObject({ input: Unit, output: Unit }).default({ input: '', output: '' }),
};

export const PlantContent = z.strictObject(content);
export type PlantContent = z.infer<typeof PlantContent>;

/** What the server keeps beside a formula, so that neither a recomputation nor a page needs a parser to run it. */
const kept = { ...content, reading: PlantReading.optional().meta({ description: 'of a formula, as it was read when it was entered' }) };
export const KeptPlant = z.strictObject(kept);
export type KeptPlant = z.infer<typeof KeptPlant>;

export const CreatePlant = z.strictObject({ name: Name, ...content, note: Note.optional() }).meta({ id: 'CreatePlant' });
export type CreatePlant = z.input<typeof CreatePlant>;
export const RevisePlant = z
  .strictObject({ name: Name.optional(), ...content, note: Note.optional(), baseRevision: Revision })
  .meta({ id: 'RevisePlant' });
export type RevisePlant = z.input<typeof RevisePlant>;

export const PlantRevision = z
  .object({
    id: Id,
    name: z.string(),
    revision: z.int(),
    ...kept,
    note: z.string().nullable(),
    createdAt: Timestamp,
    createdBy: z.string(),
  })
  .meta({ id: 'PlantRevision', description: "id is the plant's" });
export type PlantRevision = z.infer<typeof PlantRevision>;
