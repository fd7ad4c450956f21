import { z } from 'zod';
import { Id, Name, Note, ONE_LINE, Role, Timestamp } from './common';
import { Headline } from './headline';
import { OperatingRange, OperatingRanges } from './operating-range';

const Description = Note;
const Vehicle = z.string().trim().max(120, 'At most 120 characters.').regex(ONE_LINE, 'One line of text, without control characters.');

export const CreateProject = z
  .strictObject({ name: Name, vehicle: Vehicle.optional(), description: Description.optional(), teamId: Id.optional() })
  .meta({ id: 'CreateProject' });
export type CreateProject = z.infer<typeof CreateProject>;

export const UpdateProject = z
  .strictObject({
    name: Name.optional(),
    vehicle: Vehicle.optional(),
    description: Description.optional(),
    archived: z.boolean().optional(),
    operatingRange: OperatingRanges.optional().meta({ description: 'replaced whole' }),
  })
  .meta({ id: 'UpdateProject' });
export type UpdateProject = z.input<typeof UpdateProject>;

export const DeleteProject = z.strictObject({ confirmName: z.string() });

export const Project = z
  .object({
    id: Id,
    name: z.string(),
    vehicle: z.string(),
    description: z.string(),
    archived: z.boolean(),
    operatingRange: z.array(OperatingRange),
    role: Role,
    team: z.object({ id: Id, name: z.string() }),
    createdAt: Timestamp,
    updatedAt: Timestamp,
    headline: Headline.nullable().meta({ description: 'null until something was analysed' }),
    latestAnalysis: z
      .object({ id: Id, design: z.object({ id: Id, name: z.string(), revision: z.int() }), createdAt: Timestamp })
      .nullable(),
    people: z.array(z.object({ id: z.string(), name: z.string(), role: Role })),
  })
  .meta({ id: 'Project' });
export type Project = z.infer<typeof Project>;

export const Activity = z
  .object({ id: Id, at: Timestamp, by: z.string(), action: z.string(), summary: z.string(), detail: z.string().nullable() })
  .meta({ id: 'Activity' });
export type Activity = z.infer<typeof Activity>;
