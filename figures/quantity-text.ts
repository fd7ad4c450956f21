import type { Quantity } from '@/contract';
import { formatDegrees, formatFactor, formatFrequency, formatMagnitude, formatNumber, formatSeconds, withUnit } from './format';
import type { FrequencyUnit, MagnitudeUnit } from './units';

export interface ReaderUnits {
  frequency: FrequencyUnit;
  magnitude: MagnitudeUnit;
}

/** A number as it is printed: the digits, and the unit that follows them ("" for a plain factor). */
export interface QuantityText {
  number: string;
  unit: string;
  /** Both together, as a sentence has them. */
  text: string;
}

const names: Record<Quantity, string> = {
  gainMargin: 'Gain margin',
  gainReduction: 'Gain reduction',
  phaseMargin: 'Phase margin',
  delayMargin: 'Delay margin',
  ms: 'Ms',
  mt: 'Mt',
  modulusMargin: 'Modulus margin',
  diskMargin: 'Disk margin',
  noiseGain: 'Noise gain',
  bandwidth: 'Bandwidth',
  riseTime: 'Rise time',
  settlingTime: 'Settling',
  overshootPercent: 'Overshoot',
  undershootPercent: 'Undershoot',
  steadyStateError: 'Steady-state error',
  loadPeak: 'Load peak',
  loadSettlingTime: 'Load settling',
  controlPeak: 'Control peak',
};

export const quantityName = (quantity: Quantity): string => names[quantity];

function digitsAndUnit(quantity: Quantity, value: number, units: ReaderUnits): [string, string] {
  switch (quantity) {
    case 'gainMargin':
    case 'gainReduction':
    case 'noiseGain':
      return [formatMagnitude(value, units.magnitude), units.magnitude === 'dB' ? 'dB' : ''];
    case 'phaseMargin':
      return [formatDegrees(value), '°'];
    case 'bandwidth':
      return [formatFrequency(value, units.frequency), units.frequency];
    case 'overshootPercent':
    case 'undershootPercent':
      return [formatNumber(value, 1), '%'];
    case 'delayMargin':
    case 'riseTime':
    case 'settlingTime':
    case 'loadSettlingTime':
      return [formatSeconds(value), 's'];
    default:
      return [formatFactor(value), ''];
  }
}

/** A limit or a target: a whole number of a unit has no idle zero. 45°, 6 dB, 0.20 s, and 1.70 as every factor. */
export function demandedText(quantity: Quantity, value: number, units: ReaderUnits): string {
  const { number, unit } = quantityText(quantity, value, units);
  return withUnit(unit === '' ? number : number.replace(/\.0+$/, ''), unit);
}

/** The value of a quantity, given in the contract's unit, as every screen prints it. */
export function quantityText(quantity: Quantity, value: number, units: ReaderUnits): QuantityText {
  const [number, unit] = digitsAndUnit(quantity, value, units);
  return { number, unit, text: withUnit(number, unit) };
}
