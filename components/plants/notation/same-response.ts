import { plantResponse } from '@/analysis';
import type { WorkedOut } from './write-plant';

const LARGEST_DIFFERENCE = 1e-6;
const RADIANS = Math.PI / 180;

/** Whether two plants, written differently, do the same at every frequency that one would draw, to a millionth. */
export function sameResponse(one: WorkedOut, other: WorkedOut): boolean {
  const { curves, at } = plantResponse(one);
  const otherAt = plantResponse(other).at;
  return curves.frequencies.every((frequency) => {
    const a = at(frequency);
    const b = otherAt(frequency);
    if (!Number.isFinite(a.magnitude) || a.magnitude === 0) return true;
    // Unwrapped, so that a pole that crossed the axis shows as half a turn.
    const turned = (a.phaseDegrees - b.phaseDegrees) * RADIANS;
    return Math.hypot(b.magnitude / a.magnitude - 1, turned) <= LARGEST_DIFFERENCE;
  });
}
