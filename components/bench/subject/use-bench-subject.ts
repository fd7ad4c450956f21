import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { sentence } from '@/hooks/api/problem';
import { analysisQuery } from '@/hooks/queries/analyses';
import { conditionsQuery } from '@/hooks/queries/conditions';
import { designRevisionQuery, designsQuery } from '@/hooks/queries/designs';
import { projectQuery } from '@/hooks/queries/projects';
import { type BenchSubject, benchSubject, type Lack, latestDesign, revisionToFetch, wantedBy } from './bench-subject';
import type { BenchLink } from './bench-link';

export type SubjectState =
  | { readonly kind: 'waiting' }
  | { readonly kind: 'problem'; readonly text: string; retry(): void }
  | { readonly kind: 'lacking'; readonly lack: Lack }
  | { readonly kind: 'ready'; readonly subject: BenchSubject };

/**
 * Fetches what lies on the bench: the project, the conditions that its designs are judged against, the designs, and what a link names.
 *
 * @param worstCaseId the case that the bench itself found nearest its limit, once it has
 */
export function useBenchSubject(projectId: string, link: BenchLink, worstCaseId: string | undefined): SubjectState {
  const project = useQuery(projectQuery(projectId));
  const frozen = link.analysis !== undefined;
  const today = useQuery({ ...conditionsQuery(projectId), enabled: !frozen });
  const designs = useQuery(designsQuery(projectId));
  const analysis = useQuery({ ...analysisQuery(projectId, link.analysis ?? ''), enabled: frozen });

  const wanted = wantedBy(link, analysis.data ?? null);
  const latest = latestDesign(designs.data ?? [], wanted);
  const revision = revisionToFetch(latest, wanted);
  const opened = useQuery({ ...designRevisionQuery(projectId, latest?.id ?? '', revision ?? 0), enabled: revision !== null });

  const asked = [project, today, designs, analysis, opened];
  const failed = asked.find((query) => query.isError && query.data === undefined);
  const waiting = asked.some((query) => query.isLoading);
  const conditions = frozen ? analysis.data?.inputs : today.data;
  const worst = worstCaseId ?? (frozen ? analysis.data : project.data)?.headline?.case?.id;
  const { design, revision: wantedRevision, caseId } = wanted;
  const found = useMemo(() => {
    if (waiting || !project.data || !conditions || !designs.data) return null;
    const holdings = {
      project: project.data,
      conditions,
      designs: designs.data,
      openedRevision: opened.data ?? null,
      worstCaseId: worst,
    };
    return benchSubject(holdings, { design, revision: wantedRevision, caseId });
  }, [waiting, project.data, conditions, designs.data, opened.data, worst, design, wantedRevision, caseId]);
  if (failed) return { kind: 'problem', text: sentence(failed.error), retry: () => void failed.refetch() };
  if (found === null) return { kind: 'waiting' };
  return typeof found === 'string' ? { kind: 'lacking', lack: found } : { kind: 'ready', subject: found };
}
