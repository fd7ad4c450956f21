import type { Axis, CaseAxes } from '@/contract';
import { formatNumber, withUnit } from './format';
import { speedFrom, speedIn, type SpeedUnit } from './units';

/** How cases are placed, in the order in which they are named. */
export const caseAxes: readonly Axis[] = ['speed', 'mass', 'grade'];

const names: Record<Axis, string> = { speed: 'Speed', mass: 'Mass', grade: 'Grade' };
const MOST_DECIMALS = 2;
/** Digits that undo the dust of m/s to km/h and back. */
const TYPED_FIGURES = 10;

export const axisName = (axis: Axis): string => names[axis];

export function axisUnit(axis: Axis, speed: SpeedUnit): string {
  if (axis === 'speed') return speed;
  return axis === 'mass' ? 'kg' : '%';
}

/** A place on an axis in the reader's unit. Speeds are m/s, masses kg and grades % in the contract. */
export const axisIn = (axis: Axis, value: number, speed: SpeedUnit): number => (axis === 'speed' ? speedIn(speed, value) : value);

/** The reader's unit → the contract's. */
export const axisFrom = (axis: Axis, value: number, speed: SpeedUnit): number => (axis === 'speed' ? speedFrom(speed, value) : value);

/** A place as its digits are printed: at most two decimals, no idle zeros. */
export function axisNumber(axis: Axis, value: number, speed: SpeedUnit): string {
  const text = formatNumber(axisIn(axis, value, speed), MOST_DECIMALS);
  return text.replace(/\.?0+$/, '');
}

/** "30 km/h" */
export const axisText = (axis: Axis, value: number, speed: SpeedUnit): string =>
  withUnit(axisNumber(axis, value, speed), axisUnit(axis, speed));

/** "30 km/h, 1,380 kg"; empty where a case has no place. */
export const placeText = (place: CaseAxes, speed: SpeedUnit): string =>
  caseAxes.flatMap((axis) => (place[axis] === undefined ? [] : axisText(axis, place[axis], speed))).join(', ');

/** A place as a field holds it: every digit that was typed, without thousands commas. */
export const axisTyped = (axis: Axis, value: number, speed: SpeedUnit): string =>
  String(Number(axisIn(axis, value, speed).toPrecision(TYPED_FIGURES)));
