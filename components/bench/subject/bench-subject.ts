import type { Conditions, DesignRevision, FrozenCase, KeptAnalysis, Project } from '@/contract';

/** What is on the bench: one design over the cases of one project, the curves of one of them shown. */
export interface BenchSubject {
  readonly project: Project;
  readonly shownCase: FrozenCase;
  /** That of the case that is shown. */
  readonly plant: FrozenCase['plant'];
  /** What the design is judged against: as it stands now, or as an analysis froze it. */
  readonly conditions: Conditions;
  /** The revision that is laid on the bench; null while the project has no design. */
  readonly opened: DesignRevision | null;
  /** The newest kept revision of the same design. */
  readonly latest: DesignRevision | null;
  /** A link named the revision: the bench does not follow newer ones by itself. */
  readonly pinned: boolean;
}

export interface Wanted {
  readonly design?: string;
  readonly revision?: number;
  readonly caseId?: string;
}

/** What a link asks for; an analysis names its design and revision. */
export function wantedBy(link: Wanted, analysis: KeptAnalysis | null): Wanted {
  if (analysis === null) return link;
  const { design } = analysis.inputs;
  return { design: design.id, revision: design.revision, caseId: link.caseId };
}

interface Holdings {
  readonly project: Project;
  readonly conditions: Conditions;
  readonly designs: readonly DesignRevision[];
  /** A revision that the list does not hold, once it is fetched. */
  readonly openedRevision: DesignRevision | null;
  /** The case nearest its limit, as far as is known: shown where nobody chose one. */
  readonly worstCaseId: string | undefined;
}

export type Lack = 'plant' | 'design' | 'case';

const newestOf = (designs: readonly DesignRevision[]) =>
  designs.reduce<DesignRevision | null>((newest, next) => (newest === null || next.createdAt > newest.createdAt ? next : newest), null);

export const latestDesign = (designs: readonly DesignRevision[], wanted: Wanted): DesignRevision | null =>
  wanted.design === undefined ? newestOf(designs) : (designs.find(({ id }) => id === wanted.design) ?? null);

/** The revision that must be fetched besides the newest; null where the newest is the one. */
export const revisionToFetch = (latest: DesignRevision | null, wanted: Wanted): number | null =>
  latest === null || wanted.revision === undefined || wanted.revision === latest.revision ? null : wanted.revision;

function caseShown({ conditions: { cases }, worstCaseId }: Holdings, { caseId }: Wanted): FrozenCase | Lack {
  if (cases.length === 0) return 'plant';
  if (caseId !== undefined) return cases.find(({ id }) => id === caseId) ?? 'case';
  return cases.find(({ id }) => id === worstCaseId) ?? cases[0];
}

/** Puts together what is laid on the bench, or says what is lacking. */
export function benchSubject(holdings: Holdings, wanted: Wanted): BenchSubject | Lack {
  const shownCase = caseShown(holdings, wanted);
  if (typeof shownCase === 'string') return shownCase;
  const { project, conditions, designs, openedRevision } = holdings;
  const latest = latestDesign(designs, wanted);
  if (latest === null && wanted.design !== undefined) return 'design';
  const pinned = revisionToFetch(latest, wanted) !== null;
  return { project, shownCase, plant: shownCase.plant, conditions, latest, opened: pinned ? openedRevision : latest, pinned };
}
