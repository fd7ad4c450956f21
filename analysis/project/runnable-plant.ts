import type { PlantModel, PlantReading } from '@/contract';

/**
 * A kept plant as an engine without a formula parser runs it: a formula by what it was read into when it was entered, as
 * roots where it was a product and as coefficients where it was one polynomial over another; any other as it stands.
 */
export function runnablePlant({ plant, reading }: { plant: PlantModel; reading?: PlantReading }): PlantModel {
  if (plant.kind !== 'formula' || !reading) return plant;
  const { factored, gain, zeros, poles, numerator, denominator, deadTime } = reading;
  return factored ? { kind: 'roots', gain, zeros, poles, deadTime } : { kind: 'coefficients', numerator, denominator, deadTime };
}
