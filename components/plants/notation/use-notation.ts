import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { runnablePlant } from '@/analysis/project';
import { plantReadingQuery } from '@/hooks/queries/plants';
import type { ReadablePlant } from '../equation/read-back';
import type { PlantForm } from '../plant-form';
import { type Notation, textIn } from './notation';
import { readNotation } from './read-notation';
import { bringBack, sayTheSame, switchNotation } from './switch-notation';
import type { WorkedOut } from './write-plant';

interface FormAccess {
  form: PlantForm;
  /** What it is by now, when an answer took its time. */
  read: () => PlantForm;
  write: (form: PlantForm) => void;
  /** The plant that is shown; a formula with what it reads as. */
  shown: ReadablePlant | null;
}

export interface NotationChoice {
  choose: (to: Notation) => void;
  /** Why the notation that is shown does not say what the one before said, until something is typed there; null where it does. */
  reason: string | null;
  bringBack: () => void;
}

const placeIn = (form: PlantForm): string => `${form.notation} ${textIn(form, form.notation)}`;

/** Changes between notations, so that each says what the one before said, and what was typed stays. */
export function useNotation({ form: present, read, write, shown }: FormAccess): NotationChoice {
  const client = useQueryClient();
  const [refused, setRefused] = useState<{ reason: string; at: string } | null>(null);

  const workedOut = async (form: PlantForm): Promise<WorkedOut | null> => {
    const { plant } = readNotation(form, form.notation);
    if (plant?.kind !== 'formula') return plant;
    const isShown = JSON.stringify(shown?.plant) === JSON.stringify(plant);
    // Without signal the answer is no, and the change of notation does not wait for it.
    const ask = () => client.fetchQuery({ ...plantReadingQuery(plant), networkMode: 'always', retry: false }).catch(() => undefined);
    const reading = isShown && shown?.reading ? shown.reading : await ask();
    const runs = runnablePlant({ plant, reading });
    return runs.kind === 'formula' ? null : runs;
  };

  const choose = async (to: Notation) => {
    const before = read();
    const plant = sayTheSame(before, before.notation, to) ? null : await workedOut(before);
    const now = read();
    // Who typed or chose again while the server read the formula meant that.
    if (placeIn(now) !== placeIn(before)) return;
    const { form, reason: why } = switchNotation(now, to, plant);
    setRefused(why === null ? null : { reason: why, at: placeIn(form) });
    write(form);
  };

  return {
    choose: (to) => void choose(to),
    reason: refused?.at === placeIn(present) ? refused.reason : null,
    bringBack: () => write(bringBack(read())),
  };
}
