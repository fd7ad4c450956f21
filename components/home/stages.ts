import type { Case, DesignRevision, Limit, PlantRevision } from '@/contract';
import { moment } from '@/components/ui/moment';

export interface Stage {
  name: string;
  state: string;
  done: boolean;
}

export interface StageFacts {
  plants: readonly PlantRevision[];
  cases: readonly Case[];
  designs: readonly DesignRevision[];
  limits: readonly Limit[];
  /** When the newest analysis was computed. */
  analysedAt: string | null;
  now: Date;
}

const newest = <Item extends { createdAt: string }>(items: readonly Item[]): Item | undefined =>
  items.reduce<Item | undefined>((best, item) => (best && best.createdAt >= item.createdAt ? best : item), undefined);

const casesText = (cases: readonly Case[]) => (cases.length === 1 ? cases[0].name : `${cases.length || 'no'} cases`);
const limitsText = (limits: readonly Limit[]) => (limits.length === 1 ? '1 limit' : `${limits.length || 'no'} limits`);

/** How far a project has come, each stage told by what exists and by nothing else. */
export function stages({ plants, cases, designs, limits, analysedAt, now }: StageFacts): Stage[] {
  const plant = newest(plants);
  const design = newest(designs);
  return [
    {
      name: 'Plant',
      done: plant !== undefined,
      state: plant ? `${plant.name}, rev ${plant.revision}, ${moment(plant.createdAt, now)}` : 'not entered',
    },
    { name: 'Cases and limits', done: cases.length > 0 && limits.length > 0, state: `${casesText(cases)}, ${limitsText(limits)}` },
    {
      name: 'Design',
      done: design !== undefined,
      state: design ? `${design.name}, rev ${design.revision}, kept ${moment(design.createdAt, now, true)}` : 'no gains kept',
    },
    { name: 'Analysis', done: analysedAt !== null, state: analysedAt ? `computed ${moment(analysedAt, now, true)}` : 'nothing analysed' },
    { name: 'Review', done: false, state: 'nobody reviewed it' },
    { name: 'On the car', done: false, state: 'nothing recorded' },
  ];
}
