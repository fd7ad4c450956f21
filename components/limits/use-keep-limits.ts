import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import type { DesignRevision, KeptAnalysis, Limit } from '@/contract';
import { verdictWords } from '@/figures/verdict-shape';
import { ApiProblem, hasStatus, sentence } from '@/hooks/api/problem';
import { useCreateAnalysis } from '@/hooks/queries/analyses';
import { designsQuery } from '@/hooks/queries/designs';
import { usePutLimits } from '@/hooks/queries/limits';
import type { Base } from './model/limits-edit';

const newestOf = (designs: readonly DesignRevision[]) =>
  designs.reduce<DesignRevision | null>((newest, next) => (newest === null || next.createdAt > newest.createdAt ? next : newest), null);

const outcome = ({ design, verdict }: KeptAnalysis) => `${design.name}, rev ${design.revision}, judged again: ${verdictWords[verdict]}.`;

/** Keeping limits, and having the newest design judged against them, which is kept as an analysis of its own. */
export function useKeepLimits() {
  const { id } = useProject();
  const announce = useAnnounce();
  const { data: designs = [] } = useQuery(designsQuery(id));
  const design = newestOf(designs);
  const put = usePutLimits(id);
  const analyse = useCreateAnalysis(id);
  const [said, setSaid] = useState<string | null>(null);
  const [sent, setSent] = useState<readonly Limit[]>([]);
  const say = (text: string) => {
    setSaid(text);
    announce(text);
  };
  const judge = (before = '') => {
    if (design) analyse.mutate({ designId: design.id }, { onSuccess: (analysis) => say(before + outcome(analysis)) });
  };
  const keep = (items: Limit[], base: Base) => {
    setSaid(null);
    setSent(items);
    analyse.reset();
    put.mutate(
      { items, etag: base.etag },
      {
        onSuccess: () => {
          say('Kept.');
          judge('Kept. ');
        },
      },
    );
  };
  const refused = put.error instanceof ApiProblem ? (put.error.details.errors ?? []) : [];
  const overtaken = hasStatus(put.error, 412);
  return {
    keep,
    judge,
    /** The design that is judged again; null while there is none. */
    design,
    busy: put.isPending ? 'Keeping' : analyse.isPending ? 'Judging again' : null,
    /** What was done last, in words. */
    said,
    problem: put.error && !overtaken && refused.length === 0 ? sentence(put.error) : null,
    judgingProblem: analyse.error ? `The limits are kept, but judging again did not work. ${sentence(analyse.error)}` : null,
    /** What the server had against single fields of what was sent. */
    refused: { errors: refused, sent },
  };
}
