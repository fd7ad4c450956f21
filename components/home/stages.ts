import type { Case, DesignRevision, PlantRevision } from '@/contract';
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
  /** When the newest analysis was computed. */
  analysedAt: string | null;
  now: Date;
}

const newest = <Item extends { createdAt: string }>(items: readonly Item[]): Item | undefined =>
  items.reduce<Item | undefined>((best, item) => (best && best.createdAt >= item.createdAt ? best : item), undefined);

/** How far a project has come, each stage told by what exists and by nothing else. */
export function stages({ plants, cases, designs, analysedAt, now }: StageFacts): Stage[] {
  const plant = newest(plants);
  const design = newest(designs);
  return [
    {
      name: 'Plant',
      done: plant !== undefined,
      state: plant ? `${plant.name}, rev ${plant.revision}, ${moment(plant.createdAt, now)}` : 'not entered',
    },
    { name: 'Cases', done: cases.length > 0, state: cases.length === 1 ? `1, ${cases[0].name}` : `${cases.length || 'none'}` },
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
