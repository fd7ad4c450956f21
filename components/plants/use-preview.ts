import { useDeferredValue, useMemo, useState } from 'react';
import type { ReadablePlant } from './equation/read-back';
import { fieldsIn } from './notation/notation';
import { readNotation } from './notation/read-notation';
import { type FormulaReading, useFormulaReading } from './notation/use-formula-reading';
import type { PlantForm } from './plant-form';

export interface Preview {
  /** What the fields describe, as far as they can be read: the last one that could be stays. */
  plant: ReadablePlant | null;
  /** What is typed now says no plant, or one that could not be read. */
  outdated: boolean;
  formula: FormulaReading;
}

/** Reads what is typed back while it is typed. @param kept the revision that is being changed */
export function usePreview(form: PlantForm, kept: ReadablePlant | undefined): Preview {
  const typed = useDeferredValue(JSON.stringify([form.notation, fieldsIn(form, form.notation)]));
  const written = useMemo(() => {
    const [notation, fields] = JSON.parse(typed) as [PlantForm['notation'], PlantForm];
    return readNotation(fields, notation).plant;
  }, [typed]);
  const formula = useFormulaReading(written?.kind === 'formula' ? written : null, kept);
  const { reading } = formula;
  const plant = useMemo((): ReadablePlant | null => {
    if (written?.kind !== 'formula') return written && { plant: written };
    return reading && { plant: written, reading };
  }, [written, reading]);
  const [last, setLast] = useState<ReadablePlant | null>(kept ?? null);
  if (plant && plant !== last) setLast(plant);
  const unread = written === null || formula.problem !== null || formula.needsSignal;
  return { plant: plant ?? last, outdated: plant === null && unread, formula };
}
