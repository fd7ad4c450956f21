import { z } from 'zod';
import { Id, Name, ONE_LINE, Revision } from './common';

/** Conditions that the loop must survive, one by one or as a grid from lists. */

export const mostCases = 400;

export const CaseParameters = z
  .object({
    gainFactor: z
      .number()
      .refine((x) => x !== 0 && Math.abs(x) <= 1e12, 'A gain factor is not zero and of magnitude at most 1e12.')
      .optional(),
    deadTime: z.number().min(0, 'Dead time is 0 or more.').max(1e4, 'Dead time is at most 10,000 s.').optional(),
  })
  .catchall(z.number().refine((x) => Math.abs(x) <= 1e30, 'A parameter is a number of magnitude at most 1e30.'))
  .meta({
    id: 'CaseParameters',
    description:
      'what stands in place of the plant’s own: gainFactor times its gain, deadTime in s, and parameters of its formula by name. ' +
      'A formula that names a parameter deadTime or gainFactor itself gets it',
  });
export type CaseParameters = z.infer<typeof CaseParameters>;

export const Axis = z.enum(['speed', 'mass', 'grade']).meta({ id: 'Axis', description: 'speed in m/s, mass in kg, grade in %' });
export type Axis = z.infer<typeof Axis>;

const along = {
  speed: z.number().min(0, 'A speed is 0 or more.').max(200, 'A speed is at most 200 m/s.'),
  mass: z.number().gt(0, 'A mass is more than 0.').max(1e6, 'A mass is at most 1,000,000 kg.'),
  grade: z.number().min(-100, 'A grade is from −100 % to 100 %.').max(100, 'A grade is from −100 % to 100 %.'),
};
export const CaseAxes = z.strictObject({ speed: along.speed.optional(), mass: along.mass.optional(), grade: along.grade.optional() });
export type CaseAxes = z.infer<typeof CaseAxes>;

export const CaseBasis = z
  .enum(['measured', 'figures', 'extrapolated'])
  .meta({ id: 'CaseBasis', description: 'whether the plant was measured there, comes from the car’s figures, or is extrapolated' });
export type CaseBasis = z.infer<typeof CaseBasis>;

const content = {
  name: Name,
  plantId: Id,
  plantRevision: Revision.nullable().default(null).meta({ description: 'null: the latest' }),
  parameters: CaseParameters.default({}),
  axes: CaseAxes.default({}),
  basis: CaseBasis.default('extrapolated'),
};

export const CreateCase = z.strictObject(content).meta({ id: 'CreateCase' });
export type CreateCase = z.input<typeof CreateCase>;
export type CaseContent = z.output<typeof CreateCase>;

export const UpdateCase = z
  .strictObject({
    name: Name.optional(),
    plantId: Id.optional(),
    plantRevision: Revision.nullable().optional(),
    parameters: CaseParameters.optional(),
    axes: CaseAxes.optional(),
    basis: CaseBasis.optional(),
  })
  .meta({ id: 'UpdateCase', description: 'parameters and axes are replaced whole' });
export type UpdateCase = z.infer<typeof UpdateCase>;

export const Case = z
  .object({ id: Id, ...content, name: z.string(), etag: z.string().meta({ description: 'what If-Match names to change this case' }) })
  .meta({ id: 'Case' });
export type Case = z.infer<typeof Case>;

const PointName = z
  .string()
  .trim()
  .min(1, 'A point’s name has at least one character.')
  .max(36, 'A point’s name has at most 36 characters.')
  .regex(ONE_LINE, 'A point’s name is one line of text, without control characters.');
const pointParts = { name: PointName.optional(), parameters: CaseParameters.default({}), basis: CaseBasis.optional() };
const listAlong = <A extends Axis>(axis: A) =>
  z.strictObject({
    axis: z.literal(axis),
    points: z.array(z.strictObject({ at: along[axis], ...pointParts })).min(1, 'A list has at least one point.'),
  });

/** One axis of a grid: where it stands and what the plant is there. */
export const GridList = z.discriminatedUnion('axis', [listAlong('speed'), listAlong('mass'), listAlong('grade')]).meta({ id: 'GridList' });
export type GridList = z.infer<typeof GridList>;

const sizeOf = (lists: readonly GridList[]) => lists.reduce((size, { points }) => size * points.length, 1);
const repeats = <T>(values: readonly T[]) => values.findIndex((value, index) => values.indexOf(value) < index);

export const CreateGrid = z
  .strictObject({
    plantId: Id,
    plantRevision: Revision.nullable().default(null),
    lists: z.array(GridList).min(1, 'A grid is made of one list or more.').max(3, 'A grid has at most three lists.'),
    replace: z.boolean().default(false).meta({ description: 'true: in place of all cases that there are' }),
  })
  .superRefine(({ lists }, context) => {
    const size = sizeOf(lists);
    if (size > mostCases) {
      const message = `This grid has ${size.toLocaleString('en')} cases; at most ${mostCases} are allowed.`;
      return context.addIssue({ code: 'custom', path: ['lists'], message });
    }
    const twice = repeats(lists.map(({ axis }) => axis));
    if (twice >= 0) context.addIssue({ code: 'custom', path: ['lists', twice, 'axis'], message: 'Each axis has one list.' });
    lists.forEach(({ points }, index) => {
      const again = repeats(points.map(({ at }) => at));
      if (again >= 0)
        context.addIssue({ code: 'custom', path: ['lists', index, 'points', again, 'at'], message: 'This point is in the list already.' });
    });
  })
  .meta({
    id: 'CreateGrid',
    description: 'every combination of the lists’ points; gain factors multiply, any other parameter stands in one list only',
  });
export type CreateGrid = z.input<typeof CreateGrid>;

export const Cases = z.object({ items: z.array(Case) }).meta({ id: 'Cases' });
