import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findAnalysis, listAnalyses } from '@/db/stores/analysis-store';
import { listActivity } from '@/db/stores/activity-store';
import { allCases, listCases } from '@/db/stores/case-store';
import { findDesign, listDesignRevisions, listDesigns, reviseDesign } from '@/db/stores/design-store';
import { findPlant, listPlantRevisions, listPlants, revisePlant } from '@/db/stores/plant-store';
import { findProject, listProjects } from '@/db/stores/project-store';
import { DesignContent, PlantContent, type KeptAnalysis } from '@/contract';
import { aDesign, aPlant, makeProject, made, type MadeProject } from '../../support/a-project';
import { startTestApp, type TestApp } from '../../support/test-app';

const page = { limit: 50 };

let app: TestApp;
let mine: MadeProject;
let theirs: MadeProject;
let theirAnalysis: string;
let me: string;

beforeAll(async () => {
  app = await startTestApp();
  const [ada, ben] = [await app.client('ada').signUp(), await app.client('ben').signUp()];
  [mine, theirs] = [await makeProject(ada), await makeProject(ben)];
  theirAnalysis = (await made<KeptAnalysis>(ben, `${theirs.at}/analyses`, { designId: theirs.design.id })).id;
  me = mine.project.people[0].id;
});
afterAll(() => app.close());

/** Someone who knows another project's ids and asks for them under a project of their own. */
describe('every store', () => {
  it('finds nothing of another project under this one', () => {
    const projectId = mine.project.id;
    const plantKey = { projectId, plantId: theirs.plant.id };
    const designKey = { projectId, designId: theirs.design.id };
    expect(findPlant(app.db, plantKey)).toBeUndefined();
    expect(findPlant(app.db, plantKey, 1)).toBeUndefined();
    expect(listPlantRevisions(app.db, plantKey, page).items).toEqual([]);
    expect(findDesign(app.db, designKey)).toBeUndefined();
    expect(findDesign(app.db, designKey, 1)).toBeUndefined();
    expect(listDesignRevisions(app.db, designKey, page).items).toEqual([]);
    expect(findAnalysis(app.db, { projectId, analysisId: theirAnalysis })).toBeUndefined();
    expect(findProject(app.db, { userId: me, projectId: theirs.project.id })).toBeUndefined();
  });

  it('lists nothing but the project’s own', () => {
    const projectId = mine.project.id;
    expect(listPlants(app.db, projectId, page).items.map(({ id }) => id)).toEqual([mine.plant.id]);
    expect(listDesigns(app.db, projectId, page).items.map(({ id }) => id)).toEqual([mine.design.id]);
    expect(listCases(app.db, projectId, page).items.map(({ plantId }) => plantId)).toEqual([mine.plant.id]);
    expect(allCases(app.db, projectId)).toHaveLength(1);
    expect(listAnalyses(app.db, projectId, page).items).toEqual([]);
    expect(listActivity(app.db, projectId, page).items.every(({ by }) => by === 'ada')).toBe(true);
    expect(listProjects(app.db, { userId: me, archived: false }, page).items.map(({ id }) => id)).toEqual([projectId]);
  });

  it('writes nothing into another project', () => {
    const projectId = mine.project.id;
    const change = {
      projectId,
      name: 'taken over',
      activity: { id: crypto.randomUUID(), action: 'x', summary: 'x', detail: null },
      stamp: { by: me, at: new Date() },
    };
    const plant = { ...change, plantId: theirs.plant.id, content: PlantContent.parse({ plant: aPlant.plant }) };
    expect(revisePlant(app.db, plant, 1)).toBe(false);
    const design = { ...change, designId: theirs.design.id, content: DesignContent.parse({ controller: aDesign.controller }) };
    expect(reviseDesign(app.db, design, { baseRevision: 1, analysis: null })).toBe(false);
    expect(findPlant(app.db, { projectId: theirs.project.id, plantId: theirs.plant.id })).toEqual(theirs.plant);
    expect(findDesign(app.db, { projectId: theirs.project.id, designId: theirs.design.id })).toEqual(theirs.design);
    expect(listActivity(app.db, projectId, page).items.some(({ action }) => action === 'x')).toBe(false);
  });
});
