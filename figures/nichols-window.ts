import type { FrequencyResponse } from '@/contract';
import type { Interval } from './geometry';
import { nearestOddHalfTurn } from './loop-axes';
import { toDecibels } from './units';

export interface NicholsWindow {
  readonly phaseDegrees: Interval;
  readonly decibels: Interval;
}

const DECIBELS: Interval = [-36, 26];
const LARGEST_SPAN = 540;
/** Degrees drawn on both sides of −1. */
const BESIDE_SUMMIT = 90;
const ROUND = 45;

/** Every odd half turn has a −1: the window holds the one that L passes near the axis of 0 dB, and the phases L has between its decibels. */
export function nicholsWindow(responses: readonly FrequencyResponse[]): NicholsWindow {
  let [low, high] = [Infinity, -Infinity];
  let crossing: number | null = null;
  for (const { loop } of responses) {
    loop.magnitude.forEach((magnitude, i) => {
      const decibels = toDecibels(magnitude);
      if (decibels < DECIBELS[0] || decibels > DECIBELS[1]) return;
      low = Math.min(low, loop.phaseDegrees[i]);
      high = Math.max(high, loop.phaseDegrees[i]);
      if (crossing === null && magnitude <= 1) crossing = loop.phaseDegrees[i];
    });
  }
  const summit = nearestOddHalfTurn(crossing ?? -180);
  const top = Math.ceil((Math.max(high, summit + BESIDE_SUMMIT) + 10) / ROUND) * ROUND;
  const bottom = Math.floor((Math.min(low, summit - BESIDE_SUMMIT) - 10) / ROUND) * ROUND;
  const end = Math.min(top, summit + LARGEST_SPAN - BESIDE_SUMMIT);
  return { phaseDegrees: [Math.max(bottom, end - LARGEST_SPAN), end], decibels: DECIBELS };
}
