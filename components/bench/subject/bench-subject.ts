import type { Case, CaseParameters, DesignRevision, FrozenCase, KeptAnalysis, PlantRevision, Project } from '@/contract';

/** What is on the bench: one design in one case of one project. */
export interface BenchSubject {
  readonly project: Project;
  readonly plant: FrozenCase['plant'];
  readonly shownCase: { readonly id: string; readonly name: string; readonly parameters: CaseParameters };
  readonly cases: readonly Case[];
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

/** What a link asks for; an analysis names its design, revision and first case. */
export function wantedBy(link: Wanted, analysis: KeptAnalysis | null): Wanted {
  if (analysis === null) return link;
  const { design, cases } = analysis.inputs;
  return { design: design.id, revision: design.revision, caseId: link.caseId ?? cases[0]?.id };
}

interface Holdings {
  readonly project: Project;
  readonly cases: readonly Case[];
  readonly plants: readonly PlantRevision[];
  readonly designs: readonly DesignRevision[];
  readonly analysis: KeptAnalysis | null;
  /** Revisions that the lists do not hold, once they are fetched. */
  readonly openedRevision: DesignRevision | null;
  readonly plantRevision: PlantRevision | null;
}

export type Lack = 'plant' | 'design' | 'case';

const newestOf = (designs: readonly DesignRevision[]) =>
  designs.reduce<DesignRevision | null>((newest, next) => (newest === null || next.createdAt > newest.createdAt ? next : newest), null);

export const latestDesign = (designs: readonly DesignRevision[], wanted: Wanted): DesignRevision | null =>
  wanted.design === undefined ? newestOf(designs) : (designs.find(({ id }) => id === wanted.design) ?? null);

export const caseShown = (cases: readonly Case[], wanted: Wanted): Case | null =>
  wanted.caseId === undefined ? (cases[0] ?? null) : (cases.find(({ id }) => id === wanted.caseId) ?? null);

/** The revision that must be fetched besides the newest; null where the newest is the one. */
export const revisionToFetch = (latest: DesignRevision | null, wanted: Wanted): number | null =>
  latest === null || wanted.revision === undefined || wanted.revision === latest.revision ? null : wanted.revision;

function shownFrom({ analysis, cases, plants, plantRevision }: Holdings, wanted: Wanted): Pick<BenchSubject, 'plant' | 'shownCase'> | Lack {
  const frozen = analysis?.inputs.cases.find(({ id }) => id === wanted.caseId);
  if (frozen) return { plant: frozen.plant, shownCase: frozen };
  const shownCase = caseShown(cases, wanted);
  if (shownCase === null) return plants.length === 0 ? 'plant' : 'case';
  const plant = plantRevision ?? plants.find(({ id }) => id === shownCase.plantId);
  return plant ? { plant, shownCase } : 'plant';
}

/** Puts together what is laid on the bench, or says what is lacking. */
export function benchSubject(holdings: Holdings, wanted: Wanted): BenchSubject | Lack {
  const shown = shownFrom(holdings, wanted);
  if (typeof shown === 'string') return shown;
  const latest = latestDesign(holdings.designs, wanted);
  if (latest === null && wanted.design !== undefined) return 'design';
  const pinned = revisionToFetch(latest, wanted) !== null;
  return { ...shown, project: holdings.project, cases: holdings.cases, latest, opened: pinned ? holdings.openedRevision : latest, pinned };
}
