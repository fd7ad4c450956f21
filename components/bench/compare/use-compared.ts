import { useQuery } from '@tanstack/react-query';
import type { DesignRevision } from '@/contract';
import { designRevisionQuery } from '@/hooks/queries/designs';
import type { BenchSubject } from '../subject/bench-subject';
import type { BenchLink } from '../subject/bench-link';

/** What is laid beside, and what could be. */
export interface Compared {
  readonly revision: DesignRevision | null;
  readonly choices: readonly number[];
}

/** The revision to lay beside when nobody chose: the one before that on the bench. */
export function besideByDefault(opened: number | null): number | null {
  return opened === null || opened < 2 ? null : opened - 1;
}

/** The kept revision that lies beside as B. */
export function useCompared(subject: BenchSubject, link: BenchLink): Compared {
  const { latest, opened, project } = subject;
  const newest = latest?.revision ?? 0;
  const wanted = link.compare === undefined ? besideByDefault(opened?.revision ?? null) : link.compare === 'none' ? null : link.compare;
  const exists = wanted !== null && wanted <= newest;
  const { data } = useQuery({ ...designRevisionQuery(project.id, latest?.id ?? '', wanted ?? 0), enabled: exists && wanted !== newest });
  const revision = !exists ? null : wanted === newest ? latest : (data ?? null);
  return { revision, choices: Array.from({ length: newest }, (_, n) => newest - n) };
}
