import { keepAnalysis } from '@/server/analyses/keep-analysis';
import type { Context } from '@/server/context';
import { addDesignRevision, enterDesign } from '@/server/designs/design-service';
import { addCase } from '@/server/cases/case-service';
import { addGrid } from '@/server/cases/grid-service';
import { replaceLimits } from '@/server/limits/limit-service';
import { enterPlant } from '@/server/plants/plant-service';
import { changeProject, startProject } from '@/server/projects/project-service';
import { addMember } from '../stores/member-store';
import type { Stamp } from '../stores/stamp';
import type { DemoProject } from './demo-project';
import type { DemoTeam } from './seed-people';

const DAY_MS = 24 * 3600_000;
const MINUTE_MS = 60_000;

const later = ({ by, at }: Stamp, minutes: number): Stamp => ({ by, at: new Date(at.getTime() + minutes * MINUTE_MS) });

interface Place {
  readonly projectId: string;
  readonly plantId: string;
  readonly stamp: Stamp;
}

async function seedConditions(
  context: Context,
  { projectId, plantId, stamp }: Place,
  { grid, cases = [], limits }: DemoProject,
): Promise<void> {
  if (grid) await addGrid(context, projectId, { plantId, plantRevision: null, lists: grid, replace: true }, stamp);
  for (const demo of cases) await addCase(context, projectId, { ...demo, plantId, plantRevision: null }, stamp);
  if (limits) replaceLimits(context.db, { projectId, version: 0, items: limits }, later(stamp, 12));
}

/** Makes one project by the same services that the routes call, each step on its own day. */
export async function seedProject(context: Context, { teamId, engineer, others }: DemoTeam, demo: DemoProject): Promise<void> {
  const stamp = (daysAgo: number) => ({ by: engineer.id, at: new Date(Date.now() - daysAgo * DAY_MS) });
  const begun = stamp(demo.daysAgo);
  const started = startProject(context.db, { ...demo.project, teamId }, begun);
  const { project } = started;
  for (const { id, role } of others) addMember(context.db, { projectId: project.id, userId: id, role }, later(begun, 4).at);
  const { operatingRange } = demo;
  if (operatingRange) changeProject(context.db, started, { operatingRange }, later(begun, 9));
  const plant = await enterPlant(context, project.id, demo.plant, later(begun, 26));
  await seedConditions(context, { projectId: project.id, plantId: plant.id, stamp: later(begun, 41) }, demo);

  const { name, revisions } = demo.design;
  const [first, ...followers] = revisions.map(({ daysAgo, ...revision }) => ({
    content: { ...revision, sampling: 'continuous' as const, actuator: null },
    stamp: stamp(daysAgo),
  }));
  const design = await enterDesign(context, project.id, { name, ...first.content }, first.stamp);
  await keepAnalysis(context, { projectId: project.id, choice: { designId: design.id }, stamp: later(first.stamp, 7) });
  const key = { projectId: project.id, designId: design.id };
  for (const [index, revision] of followers.entries())
    await addDesignRevision(context, key, { ...revision.content, baseRevision: index + 1, analyse: true }, revision.stamp);
}
