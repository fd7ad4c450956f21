import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { PlantModel, PlantReading } from '@/contract';
import { ApiProblem, sentence } from '@/hooks/api/problem';
import { plantReadingQuery } from '@/hooks/queries/plants';
import { useSignal } from '@/hooks/use-signal';
import type { ReadablePlant } from '../equation/read-back';

type FormulaPlant = Extract<PlantModel, { kind: 'formula' }>;

const PAUSE_MS = 300;
const NOTHING: FormulaPlant = { kind: 'formula', text: '', parameters: {} };

export interface FormulaReading {
  /** Of exactly this formula; null while it is not read. */
  reading: PlantReading | null;
  /** Why it cannot be read, with the character where that is known. */
  problem: string | null;
  /** It would be read if there were signal. */
  needsSignal: boolean;
}

/** The value once it has stood still for a moment. */
function useSettled<Value>(value: Value): Value {
  const [settled, settle] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => settle(value), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return settled;
}

const reasonIn = (error: Error): string =>
  error instanceof ApiProblem ? (error.details.errors?.[0]?.detail ?? sentence(error)) : sentence(error);

/** The reading that was kept beside a formula, where it is of this one. */
const keptReading = (plant: FormulaPlant, kept: ReadablePlant | undefined): PlantReading | undefined =>
  kept?.reading && JSON.stringify(kept.plant) === JSON.stringify(plant) ? kept.reading : undefined;

/** Has a formula read by the server, which alone can, once the typing pauses. @param kept what was read before, needing no signal */
export function useFormulaReading(plant: FormulaPlant | null, kept: ReadablePlant | undefined): FormulaReading {
  const signal = useSignal();
  const asked = plant ?? NOTHING;
  const known = keptReading(asked, kept);
  const settled = useSettled(JSON.stringify(asked)) === JSON.stringify(asked);
  const query = useQuery({ ...plantReadingQuery(asked), enabled: plant !== null && known === undefined && settled });
  const reading = known ?? query.data ?? null;
  const refused = query.error instanceof ApiProblem ? query.error : null;
  return {
    reading: plant === null ? null : reading,
    problem: plant === null || reading || !refused ? null : reasonIn(refused),
    needsSignal: plant !== null && reading === null && refused === null && !signal,
  };
}
