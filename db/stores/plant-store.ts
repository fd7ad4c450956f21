import { and, count, desc, eq } from 'drizzle-orm';
import type { KeptPlant, PageQuery, PlantRevision } from '@/contract';
import type { Database } from '../open';
import { plant, plantRevision, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { insertCases, type NewCase } from './case-store';
import { before, below, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

export interface PlantKey {
  readonly projectId: string;
  readonly plantId: string;
}

interface NewRevision extends PlantKey {
  readonly name: string;
  readonly content: KeptPlant;
  readonly note?: string;
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

const columns = {
  id: plant.id,
  name: plant.name,
  revision: plantRevision.revision,
  content: plantRevision.content,
  note: plantRevision.note,
  createdAt: plantRevision.createdAt,
  createdBy: user.name,
};

const revisions = (db: Database) =>
  db
    .select(columns)
    .from(plantRevision)
    .innerJoin(plant, eq(plant.id, plantRevision.plantId))
    .innerJoin(user, eq(user.id, plantRevision.createdBy));

type Row = Omit<PlantRevision, keyof KeptPlant | 'createdAt'> & { content: KeptPlant; createdAt: Date };
const toRevision = ({ content, createdAt, ...row }: Row): PlantRevision => ({ ...row, ...content, createdAt: createdAt.toISOString() });

const owned = ({ projectId, plantId }: PlantKey) => and(eq(plant.projectId, projectId), eq(plant.id, plantId));
const isLatest = eq(plantRevision.revision, plant.latestRevision);

/** The project's plants as they are now, the one revised last first. */
export function listPlants(db: Database, projectId: string, page: PageQuery): Page<PlantRevision> {
  const rows = revisions(db)
    .where(and(eq(plant.projectId, projectId), isLatest, before(plantRevision.createdAt, plant.id, page)))
    .orderBy(desc(plantRevision.createdAt), desc(plant.id))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.createdAt, row.id], item: toRevision });
}

/** One revision of a plant, the latest where none is named. */
export function findPlant(db: Database, key: PlantKey, revision: number | null = null): PlantRevision | undefined {
  const which = revision === null ? isLatest : eq(plantRevision.revision, revision);
  const row = revisions(db)
    .where(and(owned(key), which))
    .get();
  return row && toRevision(row);
}

/** A plant's revisions, newest first. */
export function listPlantRevisions(db: Database, key: PlantKey, page: PageQuery): Page<PlantRevision> {
  const rows = revisions(db)
    .where(and(owned(key), below(plantRevision.revision, page)))
    .orderBy(desc(plantRevision.revision))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.revision, row.id], item: toRevision });
}

function insertRevision(within: Database, revision: number, { plantId, content, note, stamp }: NewRevision): void {
  within.insert(plantRevision).values({ plantId, revision, content, note, createdBy: stamp.by, createdAt: stamp.at }).run();
}

/** Writes a plant with its first revision; the project's first plant brings `firstCase`. */
export function createPlant(db: Database, created: NewRevision, firstCase: NewCase): void {
  const { projectId, plantId, name, stamp } = created;
  transact(db, (within) => {
    const [{ plants }] = within.select({ plants: count() }).from(plant).where(eq(plant.projectId, projectId)).all();
    within.insert(plant).values({ id: plantId, projectId, name, latestRevision: 1, createdAt: stamp.at, updatedAt: stamp.at }).run();
    insertRevision(within, 1, created);
    if (plants === 0) insertCases(within, projectId, [firstCase], stamp.at);
    recordActivity(within, projectId, created.activity, stamp);
  });
}

/** Writes the revision after `baseRevision`; false, and nothing written, where that is no longer the latest. */
export function revisePlant(db: Database, revised: NewRevision, baseRevision: number): boolean {
  const { projectId, name, stamp } = revised;
  return transact(db, (within) => {
    const { changes } = within
      .update(plant)
      .set({ name, latestRevision: baseRevision + 1, updatedAt: stamp.at })
      .where(and(owned(revised), eq(plant.latestRevision, baseRevision)))
      .run();
    if (changes === 0) return false;
    insertRevision(within, baseRevision + 1, revised);
    recordActivity(within, projectId, revised.activity, stamp);
    return true;
  });
}
