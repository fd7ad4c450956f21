import { describePlant, LoopError, type PlantDescription } from '@/analysis';
import type { KeptPlant } from '@/contract';

/** A plant, and beside a formula what it was read into. */
export type ReadablePlant = Pick<KeptPlant, 'plant' | 'reading'>;

/** A plant read back, however it was written; null where it has no meaning, or where a formula was not read. */
export function readBack({ plant, reading }: ReadablePlant): PlantDescription | null {
  if (plant.kind === 'formula') return reading ?? null;
  try {
    return describePlant(plant);
  } catch (error) {
    if (error instanceof LoopError) return null;
    throw error;
  }
}
