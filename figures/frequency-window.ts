import type { Analysis } from '@/contract';
import type { Interval } from './geometry';
import { frequencyFrom, frequencyIn, type FrequencyUnit } from './units';

type LoopNumbers = Pick<Analysis, 'margins' | 'sensitivity' | 'frequencyResponse'>;

/** How far the picture reaches below the first and above the last frequency that matters. */
const BELOW = 10;
const ABOVE = 5;
const LEAST_DECADES = 1.8;
const MOST_DECADES = 6;
/** A phase crossover with a gain margin beyond this (or its inverse) is of no concern. */
const FAR_GAIN_MARGIN = 30;
const MOST_CROSSOVERS = 6;
const STOPS = [1, 2, 5, 10];

const isDrawable = (frequency: number | null): frequency is number => frequency !== null && frequency > 0 && Number.isFinite(frequency);

/** The frequencies of a loop that a reader wants to see: crossovers and peaks. */
export function telltaleFrequencies({ margins, sensitivity }: LoopNumbers): number[] {
  const near = margins.phaseCrossovers.filter((c) => c.gainMarginFactor < FAR_GAIN_MARGIN && c.gainMarginFactor > 1 / FAR_GAIN_MARGIN);
  const crossovers = [...margins.gainCrossovers.slice(0, MOST_CROSSOVERS), ...near.slice(0, MOST_CROSSOVERS)].map((c) => c.frequency);
  return [...crossovers, sensitivity.ms.frequency, sensitivity.mt.frequency].filter(isDrawable);
}

/** Mt often lies far below the crossover, where nothing else happens: it does not widen the picture. */
function framing(loop: LoopNumbers): number[] {
  const mt = loop.sensitivity.mt.frequency;
  const all = telltaleFrequencies(loop);
  const others = all.filter((frequency) => frequency !== mt);
  return others.length > 0 ? others : all;
}

const stopBelow = (value: number): number => {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-12);
  return decade * (STOPS.findLast((stop) => stop <= (value / decade) * (1 + 1e-9)) ?? 1);
};

const stopAbove = (value: number): number => {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-12);
  return decade * (STOPS.find((stop) => stop >= (value / decade) * (1 - 1e-9)) ?? 10);
};

function withDecades([low, high]: Interval): Interval {
  const decades = Math.log10(high / low);
  if (decades < LEAST_DECADES) {
    const factor = 10 ** ((LEAST_DECADES - decades) / 2);
    return [low / factor, high * factor];
  }
  return decades > MOST_DECADES ? [high / 10 ** MOST_DECADES, high] : [low, high];
}

/** The first and the last frequency of a curve that a logarithmic axis can show. */
function endsOf(frequencies: readonly number[]): number[] {
  return [frequencies.find(isDrawable), frequencies.findLast(isDrawable)].filter((frequency) => frequency !== undefined);
}

/** The frequencies that are drawn when nobody chose: round the crossovers and peaks of the loops, ending on 1, 2 or 5 of the reader's unit. rad/s. */
export function frequencyWindow(loops: readonly LoopNumbers[], unit: FrequencyUnit): Interval {
  const telltales = loops.flatMap(framing);
  const drawn = loops.flatMap(({ frequencyResponse }) => endsOf(frequencyResponse?.frequencies ?? []));
  const limits: Interval = drawn.length > 0 ? [Math.min(...drawn, ...telltales), Math.max(...drawn, ...telltales)] : [1e-9, 1e12];
  const middle = drawn.length > 0 ? Math.sqrt(drawn[0] * drawn[drawn.length - 1]) : 1;
  const matters = telltales.length > 0 ? telltales : [middle];
  const wide = withDecades([Math.max(limits[0], Math.min(...matters) / BELOW), Math.min(limits[1], Math.max(...matters) * ABOVE)]);
  return betweenStops(wide, unit);
}

/** An interval of frequencies (rad/s) widened to end on 1, 2 or 5 of the reader's unit. */
export const betweenStops = ([low, high]: Interval, unit: FrequencyUnit): Interval => [
  frequencyFrom(unit, stopBelow(frequencyIn(unit, low))),
  frequencyFrom(unit, stopAbove(frequencyIn(unit, high))),
];
