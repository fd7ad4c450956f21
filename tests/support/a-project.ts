import type { CreateDesign, CreatePlant, DesignRevision, PlantRevision, Project } from '@/contract';
import type { Client } from './client';

export const aPlant: CreatePlant = {
  name: 'Watered asphalt',
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  deadTimeBasis: 'measured',
  units: { input: 'kN·m', output: 'm/s' },
};

export const aDesign: CreateDesign = {
  name: 'Speed hold',
  controller: { form: 'parallel', kp: 1.2, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
  sampling: 'continuous',
};

export interface MadeProject {
  /** `/api/projects/<id>` */
  readonly at: string;
  readonly project: Project;
  readonly plant: PlantRevision;
  readonly design: DesignRevision;
}

/** What a call answered, once it has succeeded. */
export async function made<Body>(client: Client, path: string, body: unknown): Promise<Body> {
  const reply = await client.call<Body>('POST', path, body);
  if (reply.status !== 201) throw new Error(`POST ${path} answered ${reply.status}: ${reply.text}`);
  return reply.body;
}

/** A project with one plant, its nominal case and one design, made through the API. */
export async function makeProject(client: Client, name = 'Wet-track speed hold'): Promise<MadeProject> {
  const project = await made<Project>(client, '/api/projects', { name, vehicle: 'Heron 14' });
  const at = `/api/projects/${project.id}`;
  const plant = await made<PlantRevision>(client, `${at}/plants`, aPlant);
  const design = await made<DesignRevision>(client, `${at}/designs`, aDesign);
  return { at, project, plant, design };
}
