import type { Axis, Edge, OperatingRange } from '@/contract';
import { axisText } from '@/figures/axis-text';
import type { SpeedUnit } from '@/figures/units';

const furthest: Readonly<Record<Axis, Record<Edge['end'], string>>> = {
  speed: { low: 'slowest', high: 'fastest' },
  mass: { low: 'lightest', high: 'heaviest' },
  grade: { low: 'lowest grade', high: 'highest grade' },
};
const further: Readonly<Record<Axis, Record<Edge['end'], string>>> = {
  speed: { low: 'slower', high: 'faster' },
  mass: { low: 'lighter', high: 'heavier' },
  grade: { low: 'lower', high: 'higher' },
};

/** One end of what was checked along an axis: the case that stands there, and what the project says of it. */
export interface EndOfAxis {
  readonly edge: Edge;
  /** Where the case stands, in the contract's unit. */
  readonly at: number;
  readonly declared: OperatingRange | undefined;
}

/** "the slowest case" */
export const endName = ({ axis, end }: Pick<Edge, 'axis' | 'end'>): string =>
  axis === 'grade' ? `the case of the ${furthest[axis][end]}` : `the ${furthest[axis][end]} case`;

/** "nothing slower than 30 km/h" */
export const beyondText = ({ edge: { axis, end }, at }: EndOfAxis, speed: SpeedUnit): string =>
  `nothing ${further[axis][end]} than ${axisText(axis, at, speed)}`;

/** Why nothing lies beyond a declared end: "the loop lets go below 30 km/h (takes up from 35 km/h)". */
export function declaredText(end: EndOfAxis, speed: SpeedUnit): string {
  const { edge, declared } = end;
  const lowSpeed = edge.axis === 'speed' && edge.end === 'low';
  if (!lowSpeed || !declared || declared.disengage === null) return `${beyondText(end, speed)} can happen`;
  const takesUp = declared.engage === null ? '' : ` (takes up from ${axisText('speed', declared.engage, speed)})`;
  return `the loop lets go below ${axisText('speed', declared.disengage, speed)}${takesUp}`;
}

/** A list as a sentence has it: "a, b and c". */
export const together = (parts: readonly string[]): string =>
  parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} and ${parts[parts.length - 1]}`;
