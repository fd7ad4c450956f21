import { formatGain, type GainEdge, type GainStretch, type UnstableGains } from '@/figures';

const FIGURES = 3;

/** Rounded to what is printed, away from the limit: what is said to hold does. */
function inwards(value: number, direction: 'up' | 'down'): string {
  if (value === 0) return formatGain(0);
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - FIGURES + 1);
  const steps = value / step;
  return formatGain((direction === 'up' ? Math.ceil(steps) : Math.floor(steps)) * step);
}

const ending = (word: string, edge: GainEdge | undefined, direction: 'up' | 'down') =>
  edge && `${word} ${inwards(edge.value, direction)} (${edge.name}, ${edge.case})`;

function stretchWords({ low, high }: GainStretch): string {
  const ends = [ending('from', low, 'up'), ending('to', high, 'down')].filter((words) => words !== undefined);
  return `Every limit holds ${ends.length === 0 ? 'as far as was looked' : ends.join(' ')}.`;
}

function unstableWords({ below, above }: UnstableGains): string | null {
  const ends = [below === undefined ? null : `below ${formatGain(below)}`, above === undefined ? null : `from ${formatGain(above)}`];
  const words = ends.filter((end) => end !== null);
  return words.length === 0 ? null : `Some case is unstable ${words.join(' and ')}.`;
}

/** What the marks of a gain's rule say, in a sentence: "Every limit holds from 0.97 (Overshoot, 30 km/h) to 1.12 (Ms, 30 km/h)." */
export const describeRule = (stretch: GainStretch | undefined, unstable: UnstableGains = {}): string =>
  [stretch && stretchWords(stretch), unstableWords(unstable)].filter(Boolean).join(' ');
