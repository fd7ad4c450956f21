import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { CreatePlant, KeptPlant, PlantContent, PlantRevision, RevisePlant } from '@/contract';
import { createPlant, findPlant, revisePlant, type PlantKey } from '@/db/stores/plant-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import type { Context } from '../context';
import { NotFound } from '../http/problem';
import { staleRevision } from '../http/stale-revision';

type Parts = Pick<Context, 'db' | 'jobs'>;

/** @throws NotFound */
export function openPlant({ db }: Pick<Parts, 'db'>, key: PlantKey, revision: number | null = null): PlantRevision {
  const found = findPlant(db, key, revision);
  if (!found) throw new NotFound();
  return found;
}

/** The plant as it is kept: a formula with what it reads as. @throws LoopRefused where the plant has no meaning */
async function read({ jobs }: Pick<Parts, 'jobs'>, content: PlantContent): Promise<KeptPlant> {
  const reading = await jobs.describe(content.plant);
  return content.plant.kind === 'formula' ? { ...content, reading } : content;
}

/**
 * Enters a plant with its first revision. The project's first plant brings the case “nominal”, which follows its latest revision.
 * @throws LoopRefused where the plant has no meaning
 */
export async function enterPlant(
  parts: Parts,
  projectId: string,
  { name, note, ...entered }: z.output<typeof CreatePlant>,
  stamp: Stamp,
): Promise<PlantRevision> {
  const content = await read(parts, entered);
  const plantId = randomUUID();
  const nominal = {
    id: randomUUID(),
    name: 'nominal',
    plantId,
    plantRevision: null,
    parameters: {},
    axes: {},
    basis: 'extrapolated' as const,
  };
  const activity = activityEntry('plant.created', `entered the plant ${name}`, note);
  createPlant(parts.db, { projectId, plantId, name, content, note, activity, stamp }, nominal);
  return openPlant(parts, { projectId, plantId });
}

/**
 * Adds a revision; the ones before it stay as they are.
 * @throws NotFound, LoopRefused as enterPlant, Conflict where `baseRevision` is not the latest
 */
export async function addPlantRevision(
  parts: Parts,
  key: PlantKey,
  { baseRevision, note, name, ...entered }: z.output<typeof RevisePlant>,
  stamp: Stamp,
): Promise<PlantRevision> {
  const before = openPlant(parts, key);
  if (before.revision !== baseRevision) throw staleRevision(before.revision);
  const content = await read(parts, entered);
  const revised = { ...key, name: name ?? before.name, content, note, stamp };
  const activity = activityEntry('plant.revised', `changed the plant ${revised.name} to revision ${baseRevision + 1}`, note);
  if (!revisePlant(parts.db, { ...revised, activity }, baseRevision)) throw staleRevision(openPlant(parts, key).revision);
  return openPlant(parts, key, baseRevision + 1);
}
