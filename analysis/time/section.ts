import type { Complex } from '@/analysis/numbers/complex';
import type { Rational } from '@/analysis/loop/model';

/** One or two poles with the zeros that go with them; real, so complex roots come as whole pairs. */
export interface Section {
  readonly poles: readonly Complex[];
  readonly zeros: readonly Complex[];
}

type Group = readonly Complex[];

/**
 * A proper rational function as a chain of first- and second-order sections, without its gain.
 *
 * Each zero joins the nearest pole that has room for it, so that no section's gain swings by decades and stiff
 * functions keep their digits; expanded coefficients would lose them.
 */
export function sectionsOf({ zeros, poles }: Rational): Section[] {
  const free = groupsOf(poles);
  const sections: { poles: Group; zeros: Complex[] }[] = [];
  const zeroGroups = groupsOf(zeros).sort((a, b) => b.length - a.length);
  for (const group of zeroGroups) {
    const host = group.length === 1 ? sections.find((section) => section.zeros.length < section.poles.length) : undefined;
    if (host && !free.length) host.zeros.push(...group);
    else sections.push({ poles: takePoles(free, group), zeros: [...group] });
  }
  return [...sections, ...free.map((group) => ({ poles: group, zeros: [] }))];
}

/** Real roots alone, complex ones as pairs. */
function groupsOf(roots: readonly Complex[]): Group[] {
  return roots.filter((root) => root.im >= 0).map((root) => (root.im > 0 ? [root, { re: root.re, im: -root.im }] : [root]));
}

/** Takes from `free` the poles for a group of zeros: the nearest group large enough, or two real poles for a pair. */
function takePoles(free: Group[], zeros: Group): Group {
  const target = zeros[0];
  const nearness = (group: Group) => Math.hypot(group[0].re - target.re, group[0].im - target.im);
  const byNearness = [...free].sort((a, b) => nearness(a) - nearness(b));
  const sameSize = byNearness.filter((group) => group.length === zeros.length);
  const chosen = sameSize.length ? [sameSize[0]] : zeros.length === 1 ? [byNearness[0]] : byNearness.slice(0, 2);
  for (const group of chosen) free.splice(free.indexOf(group), 1);
  return chosen.flat();
}
