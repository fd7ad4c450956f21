import type { Rational } from '@/analysis/loop/model';

/** Below this damping a pair stands out as a peak or a dip. */
const RESONANT = 0.5;

/** Frequencies near which the loop bends: every corner, both flanks and the top of every resonance, one turn of dead time. */
export const landmarks = (parts: readonly Rational[], deadTime: number): number[] => {
  const roots = parts.flatMap((part) => [...part.zeros, ...part.poles]).filter((root) => root.im >= 0);
  const found = roots.flatMap(({ re, im }) => {
    const size = Math.hypot(re, im);
    if (size === 0) return [];
    if (im === 0 || Math.abs(re) > RESONANT * size) return [size];
    return [im - Math.abs(re), im, size, im + Math.abs(re)].filter((omega) => omega > 0);
  });
  if (deadTime > 0) found.push(1 / deadTime);
  if (found.length === 0) found.push(1);
  return [...new Set(found)].sort((a, b) => a - b);
};

/** Frequencies of the undamped poles and zeros away from the origin, ascending. */
export const axisFrequencies = (parts: readonly Rational[]): number[] => {
  const roots = parts.flatMap((part) => [...part.zeros, ...part.poles]);
  return [...new Set(roots.filter((root) => root.re === 0 && root.im > 0).map((root) => root.im))].sort((a, b) => a - b);
};
