import { shortNumber } from './format';
import type { Interval } from './geometry';
import { type GainScaleInput, gainScale } from './gain-scale';
import { type RuleLabel, ruleTicks, type RuleTick } from './gain-rule-ticks';
import { straightKerb, type StraightKerb } from './kerb';
import { textWidth } from './text-width';

/** Where, around the present gain, the first limit stops holding, which that is, and in which case ("30 km/h, 1,380 kg"). */
export interface GainEdge {
  value: number;
  name: string;
  case: string;
}

/** The stretch in which every limit holds; an end that is not known or has no limit is absent. */
export interface GainStretch {
  low?: GainEdge;
  high?: GainEdge;
}

/** Gains at or beyond which some case is unstable. */
export interface UnstableGains {
  below?: number;
  above?: number;
}

export interface GainRuleInput extends GainScaleInput {
  kept: number | null;
  stretch?: GainStretch;
  unstable?: UnstableGains;
}

export interface RuleText {
  readonly x: number;
  readonly text: string;
  readonly anchor: 'start' | 'end';
}

export interface GainRuleShape {
  readonly ticks: readonly RuleTick[];
  readonly labels: readonly RuleLabel[];
  /** Pixels between which every limit holds; null where nobody looked. */
  readonly held: Interval | null;
  /** Limits in view: a red tick and its name under the rule. */
  readonly edges: readonly (RuleText & { readonly tick: number })[];
  readonly kerbs: readonly { readonly x: number; readonly shape: StraightKerb }[];
  /** What is unstable, in words, in a row below the names. */
  readonly warnings: readonly RuleText[];
  readonly kept: number | null;
}

/** Heights of the rule's rows, from its top. */
export const ruleRows = { baseline: 30, edge: 53, warning: 69, height: 74 } as const;

const inside = (x: number, width: number): boolean => x > 0 && x < width;

type EdgeText = GainRuleShape['edges'][number];

/** Between the names of both ends, px. */
const BETWEEN_NAMES = 10;

/** What an edge is called, from all there is to say to what there is always room for. */
const callings: readonly ((edge: GainEdge) => string)[] = [
  (edge) => `${edge.name}, ${edge.case}`,
  (edge) => `${edge.name}, ${edge.case.split(', ')[0]}`,
  (edge) => edge.name,
];

function edgeText(text: string, x: number, end: 'low' | 'high', width: number): EdgeText {
  const length = textWidth(text);
  if (end === 'low') return { tick: x, text, x: Math.max(x + 2, length), anchor: 'end' };
  return { tick: x, text, x: Math.min(x - 2, width - length), anchor: 'start' };
}

function warningText(value: number, end: 'below' | 'above', x: number, width: number): RuleText {
  const number = shortNumber(value);
  if (end === 'below') return { x: 0, anchor: 'start', text: `${inside(x, width) ? '' : '‹ '}unstable below ${number}` };
  return { x: width, anchor: 'end', text: `unstable from ${number}${inside(x, width) ? '' : ' ›'}` };
}

/** The edges in view, called by as much as both have room for. */
function edgesOf({ low, high }: GainStretch, at: (value: number) => number, width: number): GainRuleShape['edges'] {
  const inView = (edge: GainEdge | undefined) => (edge && inside(at(edge.value), width) ? edge : undefined);
  const [left, right] = [inView(low), inView(high)];
  const called = callings.map((calling) => ({
    low: left && edgeText(calling(left), at(left.value), 'low', width),
    high: right && edgeText(calling(right), at(right.value), 'high', width),
  }));
  const fits = ({ low: a, high: b }: (typeof called)[number]) => (a?.x ?? 0) + (a && b ? BETWEEN_NAMES : 0) <= (b?.x ?? width);
  const chosen = called.find(fits) ?? called[called.length - 1];
  return [chosen.low, chosen.high].filter((edge) => edge !== undefined);
}

function unstableOf(unstable: UnstableGains, at: (value: number) => number, width: number) {
  const kerbs: { x: number; shape: StraightKerb }[] = [];
  const warnings: RuleText[] = [];
  for (const end of ['below', 'above'] as const) {
    const value = unstable[end];
    if (value === undefined) continue;
    const x = at(value);
    warnings.push(warningText(value, end, x, width));
    if (!inside(x, width)) continue;
    const y = ruleRows.baseline;
    const [from, to] = end === 'below' ? [0, x] : [x, width];
    kerbs.push({ x, shape: straightKerb({ from: { x: from, y }, to: { x: to, y }, thickness: 8, block: 8, side: 'right' }) });
  }
  return { kerbs, warnings };
}

/** A gain as a slide rule: fixed needle in the middle, sliding scale, the first limits on both sides, stripes only where some case is unstable. */
export function gainRule(input: GainRuleInput): GainRuleShape {
  const { width, kept, stretch, unstable = {} } = input;
  const scale = gainScale(input);
  // On a log scale what is 0 or negative lies infinitely far to the left.
  const at = (value: number) => (input.mode === 'log' && value <= 0 ? -Infinity : scale.at(value));
  const bound = (edge: GainEdge | undefined, open: number) => (edge === undefined ? open : Math.max(0, Math.min(width, at(edge.value))));
  const keptX = kept === null ? null : at(kept);
  return {
    ...ruleTicks(scale, input.mode, width),
    held: stretch === undefined ? null : [bound(stretch.low, 0), bound(stretch.high, width)],
    edges: stretch === undefined ? [] : edgesOf(stretch, at, width),
    ...unstableOf(unstable, at, width),
    kept: keptX !== null && inside(keptX, width) ? keptX : null,
  };
}
