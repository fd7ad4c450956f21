import { range, tickStep } from 'd3-array';
import { shortNumber } from './format';
import { multiples } from './linear-axis';
import type { GainMode, GainScale } from './gain-scale';
import { textWidth } from './text-width';

export interface RuleTick {
  readonly x: number;
  readonly height: number;
}

export interface RuleLabel {
  readonly x: number;
  readonly text: string;
  readonly isZero: boolean;
}

interface Division {
  value: number;
  height: number;
  /** Smaller is named first where names would touch; null is never named. */
  rank: number | null;
}

const HEIGHTS = { zero: 16, large: 12, middle: 8, small: 5 };
const CLEAR_OF_NEEDLE = 14;
const CLEAR_OF_ENDS = 10;
const LABEL_GAP = 5;
/** Pixels between names of a linear rule. */
const LINEAR_PITCH = 60;

/** Tenths below five of a decade and halves above, integers tall; 1.5 is named with the integers. */
function logDivisions([low, high]: readonly [number, number]): Division[] {
  const exponents = range(Math.floor(Math.log10(low)), Math.ceil(Math.log10(high)) + 1);
  return exponents.flatMap((exponent) =>
    range(10, 100)
      .filter((tenths) => tenths <= 50 || tenths % 5 === 0)
      .map((tenths) => ({
        value: Number(`${tenths}e${exponent - 1}`),
        height: tenths % 10 === 0 ? HEIGHTS.large : tenths % 5 === 0 ? HEIGHTS.middle : HEIGHTS.small,
        rank: tenths % 10 === 0 ? ([10, 20, 50].includes(tenths) ? 0 : 1) : tenths === 15 ? 2 : null,
      })),
  );
}

/** Names at round steps that have room, four divisions between them, zero tallest. */
function linearDivisions(domain: readonly [number, number], width: number): Division[] {
  const step = tickStep(domain[0], domain[1], width / LINEAR_PITCH);
  return multiples(step / 4, domain).map((value) => {
    const quarters = Math.round((value / step) * 4);
    if (quarters === 0) return { value, height: HEIGHTS.zero, rank: 0 };
    const height = quarters % 4 === 0 ? HEIGHTS.large : quarters % 2 === 0 ? HEIGHTS.middle : HEIGHTS.small;
    return { value, height, rank: quarters % 4 === 0 ? 1 : null };
  });
}

function legibleLabels(divisions: readonly Division[], scale: GainScale, width: number): RuleLabel[] {
  const kept: (RuleLabel & { half: number })[] = [];
  const ranked = divisions.filter((d) => d.rank !== null).sort((a, b) => Number(a.rank) - Number(b.rank));
  for (const { value } of ranked) {
    const x = scale.at(value);
    const text = shortNumber(value);
    const half = textWidth(text) / 2;
    const clear = Math.abs(x - width / 2) > CLEAR_OF_NEEDLE && x > CLEAR_OF_ENDS && x < width - CLEAR_OF_ENDS;
    if (clear && kept.every((other) => Math.abs(other.x - x) >= other.half + half + LABEL_GAP))
      kept.push({ x, text, isZero: value === 0, half });
  }
  return kept.map(({ x, text, isZero }) => ({ x, text, isZero })).sort((a, b) => a.x - b.x);
}

/** The divisions of a gain rule in view, and the names that neither touch each other nor the needle nor the ends. */
export function ruleTicks(scale: GainScale, mode: GainMode, width: number): { ticks: RuleTick[]; labels: RuleLabel[] } {
  const [low, high] = scale.domain;
  const divisions = (mode === 'log' ? logDivisions(scale.domain) : linearDivisions(scale.domain, width)).filter(
    (d) => d.value >= low && d.value <= high,
  );
  return { ticks: divisions.map((d) => ({ x: scale.at(d.value), height: d.height })), labels: legibleLabels(divisions, scale, width) };
}
