import { useQuery } from '@tanstack/react-query';
import { sentence } from '@/hooks/api/problem';
import { analysisQuery } from '@/hooks/queries/analyses';
import { casesQuery } from '@/hooks/queries/cases';
import { designRevisionQuery, designsQuery } from '@/hooks/queries/designs';
import { plantRevisionQuery, plantsQuery } from '@/hooks/queries/plants';
import { projectQuery } from '@/hooks/queries/projects';
import { type BenchSubject, benchSubject, caseShown, type Lack, latestDesign, revisionToFetch, wantedBy } from './bench-subject';
import type { BenchLink } from './bench-link';

export type SubjectState =
  | { readonly kind: 'waiting' }
  | { readonly kind: 'problem'; readonly text: string; retry(): void }
  | { readonly kind: 'lacking'; readonly lack: Lack }
  | { readonly kind: 'ready'; readonly subject: BenchSubject };

/** Fetches what lies on the bench: the project, its plants, cases and designs, and the revisions that a link or a case names. */
export function useBenchSubject(projectId: string, link: BenchLink): SubjectState {
  const project = useQuery(projectQuery(projectId));
  const plants = useQuery(plantsQuery(projectId));
  const cases = useQuery(casesQuery(projectId));
  const designs = useQuery(designsQuery(projectId));
  const analysis = useQuery({ ...analysisQuery(projectId, link.analysis ?? ''), enabled: link.analysis !== undefined });

  const wanted = wantedBy(link, analysis.data ?? null);
  const latest = latestDesign(designs.data ?? [], wanted);
  const revision = revisionToFetch(latest, wanted);
  const opened = useQuery({ ...designRevisionQuery(projectId, latest?.id ?? '', revision ?? 0), enabled: revision !== null });
  const shown = caseShown(cases.data ?? [], wanted);
  const pinnedPlant = shown?.plantRevision ?? null;
  const plant = useQuery({ ...plantRevisionQuery(projectId, shown?.plantId ?? '', pinnedPlant ?? 0), enabled: pinnedPlant !== null });

  const asked = [project, plants, cases, designs, analysis, opened, plant];
  const failed = asked.find((query) => query.isError && query.data === undefined);
  if (failed) return { kind: 'problem', text: sentence(failed.error), retry: () => void failed.refetch() };
  if (asked.some((query) => query.isLoading) || !project.data || !plants.data || !cases.data || !designs.data) return { kind: 'waiting' };
  const found = benchSubject(
    {
      project: project.data,
      plants: plants.data,
      cases: cases.data,
      designs: designs.data,
      analysis: analysis.data ?? null,
      openedRevision: opened.data ?? null,
      plantRevision: plant.data ?? null,
    },
    wanted,
  );
  return typeof found === 'string' ? { kind: 'lacking', lack: found } : { kind: 'ready', subject: found };
}
