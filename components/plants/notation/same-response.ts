import { plantResponse } from '@/analysis';
import type { WorkedOut } from './write-plant';

const LARGEST_DIFFERENCE = 1e-6;
const RADIANS = Math.PI / 180;

/** A few last digits of a frequency. */
const NEXT = 1 + 1e-12;

type At = ReturnType<typeof plantResponse>['at'];

function difference(a: ReturnType<At>, b: ReturnType<At>): number {
  // Unwrapped, so that a pole that crossed the axis shows as half a turn.
  return Math.hypot(b.magnitude / a.magnitude - 1, (a.phaseDegrees - b.phaseDegrees) * RADIANS);
}

/** Whether two plants, written differently, do the same at every frequency that one would draw, to a millionth. */
export function sameResponse(one: WorkedOut, other: WorkedOut): boolean {
  const { curves, at } = plantResponse(one);
  const otherAt = plantResponse(other).at;
  return curves.frequencies.every((frequency) => {
    const a = at(frequency);
    if (!Number.isFinite(a.magnitude) || a.magnitude === 0) return true;
    // So near an undamped pole that the frequency's own last digits decide: that tells nothing of the plants.
    if (difference(a, at(frequency * NEXT)) > LARGEST_DIFFERENCE) return true;
    return difference(a, otherAt(frequency)) <= LARGEST_DIFFERENCE;
  });
}
