import type { Quantity } from '@/contract';
import { fromDecibels, frequencyFrom, frequencyIn, toDecibels, typographicMinus } from '@/figures';
import type { ReaderUnits } from '@/figures/quantity-text';

/** The unit in which a demand is typed and shown. */
export interface DemandUnit {
  readonly name: string;
  /** The contract's unit → this one. */
  readonly shown: (value: number) => number;
  /** This unit → the contract's. */
  readonly kept: (value: number) => number;
  /** Fewer decimals than these look unfinished, as in Ms 1.7. */
  readonly leastDecimals: number;
}

const asIs = (value: number) => value;
const plain = (name: string, leastDecimals = 0): DemandUnit => ({ name, shown: asIs, kept: asIs, leastDecimals });

export function demandUnit(quantity: Quantity, { magnitude, frequency }: ReaderUnits): DemandUnit {
  switch (quantity) {
    case 'gainMargin':
    case 'gainReduction':
    case 'noiseGain':
      return magnitude === 'dB' ? { name: 'dB', shown: toDecibels, kept: fromDecibels, leastDecimals: 0 } : plain('');
    case 'bandwidth':
      return {
        name: frequency,
        shown: (value) => frequencyIn(frequency, value),
        kept: (value) => frequencyFrom(frequency, value),
        leastDecimals: 0,
      };
    case 'phaseMargin':
      return plain('°');
    case 'overshootPercent':
    case 'undershootPercent':
      return plain('%');
    case 'delayMargin':
      return plain('s', 2);
    case 'riseTime':
    case 'settlingTime':
    case 'loadSettlingTime':
      return plain('s');
    case 'ms':
    case 'mt':
    case 'modulusMargin':
    case 'diskMargin':
      return plain('', 2);
    default:
      return plain('');
  }
}

const MOST_DIGITS = 12;
/** Of a number that no short one stands for, as 1/1.7. */
const DIGITS_OTHERWISE = 6;
/** What a conversion there and back may leave, a few units in the last place. */
const SAME = 1e-13;

function digits(value: number, leastDecimals: number): string {
  const text = String(value);
  if (text.includes('e')) return text;
  const decimals = text.split('.')[1]?.length ?? 0;
  return decimals < leastDecimals ? value.toFixed(leastDecimals) : text;
}

/**
 * A kept demand as its field shows it: the shortest number that means the very same, so that what was typed in this unit is
 * shown as it was typed; six figures where there is none of twelve.
 *
 * @example demandDigits(10 ** (6 / 20), demandUnit('gainMargin', { magnitude: 'dB', frequency: 'rad/s' })) // "6"
 */
export function demandDigits(value: number, { shown, leastDecimals }: DemandUnit): string {
  const exact = shown(value);
  for (let figures = 1; figures <= MOST_DIGITS; figures++) {
    const short = Number(exact.toPrecision(figures));
    if (Math.abs(short - exact) <= SAME * Math.abs(exact)) return typographicMinus(digits(short, leastDecimals));
  }
  return typographicMinus(digits(Number(exact.toPrecision(DIGITS_OTHERWISE)), leastDecimals));
}
