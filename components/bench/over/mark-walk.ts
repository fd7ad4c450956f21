import { type Gain, isTime, mustBePositive } from '../draft/gain';
import type { Settings } from '../draft/settings';

/** Which way a gain is turned. */
export type MarkSide = 'down' | 'up';

/** The way that is walked to find what a gain breaks first: from where it stands to as far as is looked. */
export interface MarkWalk {
  readonly from: number;
  readonly to: number;
  /** The gain at a place between both. */
  readonly valueAt: (place: number) => number;
}

/** As far as thirty times the gain or a thirtieth of it: well beyond the rule's ends. */
const FARTHEST = Math.log(30);

/** Gains of either sign are walked on a logarithmic scale, as their rule is drawn; from 0 it is walked in plain steps. */
export function markWalk(settings: Settings, gain: Gain, side: MarkSide): MarkWalk | null {
  const value = settings[gain];
  if (value === null) return null;
  const direction = side === 'up' ? 1 : -1;
  if (value === 0) {
    if (side === 'down' && (isTime(gain, settings.form) || mustBePositive(gain, settings.form))) return null;
    const size = Math.abs(settings.kp) || 1;
    return { from: 0, to: direction * size, valueAt: (place) => place };
  }
  // Turned up, a negative gain comes nearer to 0.
  const outwards = direction * Math.sign(value);
  return { from: 0, to: outwards * FARTHEST, valueAt: (place) => value * Math.exp(place) };
}
