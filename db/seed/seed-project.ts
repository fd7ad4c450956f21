import { keepAnalysis } from '@/server/analyses/keep-analysis';
import type { Context } from '@/server/context';
import { addDesignRevision, enterDesign } from '@/server/designs/design-service';
import { enterPlant } from '@/server/plants/plant-service';
import { startProject } from '@/server/projects/project-service';
import { addMember } from '../stores/member-store';
import type { Stamp } from '../stores/stamp';
import type { DemoProject } from './demo-projects';
import type { DemoTeam } from './seed-people';

const DAY_MS = 24 * 3600_000;
const MINUTE_MS = 60_000;

const later = ({ by, at }: Stamp, minutes: number): Stamp => ({ by, at: new Date(at.getTime() + minutes * MINUTE_MS) });

/** Makes one project by the same services that the routes call, each step on its own day. */
export async function seedProject(context: Context, { teamId, engineer, others }: DemoTeam, demo: DemoProject): Promise<void> {
  const stamp = (daysAgo: number) => ({ by: engineer.id, at: new Date(Date.now() - daysAgo * DAY_MS) });
  const begun = stamp(demo.daysAgo);
  const { project } = startProject(context.db, { ...demo.project, teamId }, begun);
  for (const { id, role } of others) addMember(context.db, { projectId: project.id, userId: id, role }, later(begun, 4).at);
  await enterPlant(context, project.id, demo.plant, later(begun, 26));

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
