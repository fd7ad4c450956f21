import type { CaseBasis } from '@/contract';

/** How well a case's plant is known, as a tag and as a sentence. */
export const basisWords: Readonly<Record<CaseBasis, { tag: string; sentence: string }>> = {
  measured: { tag: 'measured', sentence: 'The plant was measured there.' },
  figures: { tag: 'from figures', sentence: 'The plant comes from the car’s figures, nobody measured it there.' },
  extrapolated: { tag: 'extrapolated', sentence: 'The plant is extrapolated: nobody measured it there.' },
};

export const bases: readonly CaseBasis[] = ['measured', 'figures', 'extrapolated'];
