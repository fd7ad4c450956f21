import type { Analysis, Quantity } from '@/contract';

/** Whether the server's numbers for what was kept are those that the bench showed. */
export type Agreement =
  | { readonly kind: 'agree' }
  | { readonly kind: 'differ'; readonly quantity: Quantity | 'stability'; readonly bench: number | null; readonly server: number | null };

/** Six digits: both sides refine every number to 1e-10 on the same function, so that more than this is a defect. */
export const TOLERANCE = 5e-7;

const compared: readonly { quantity: Quantity; value: (analysis: Analysis) => number | null }[] = [
  { quantity: 'ms', value: ({ sensitivity }) => sensitivity.ms.value },
  { quantity: 'phaseMargin', value: ({ margins }) => margins.phase?.degrees ?? null },
  { quantity: 'gainMargin', value: ({ margins }) => margins.gain?.factor ?? null },
  { quantity: 'delayMargin', value: ({ margins }) => margins.delay?.seconds ?? null },
];

function same(a: number | null, b: number | null): boolean {
  if (a === null || b === null) return a === b;
  return Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b));
}

/** Lays the bench's analysis beside the server's of the same case: stability first, then Ms and the margins. */
export function agreementOf(bench: Analysis, server: Analysis): Agreement {
  const unstable = [bench.closedLoop.unstablePoles, server.closedLoop.unstablePoles];
  if (unstable[0] !== unstable[1]) return { kind: 'differ', quantity: 'stability', bench: unstable[0], server: unstable[1] };
  for (const { quantity, value } of compared) {
    const [ours, theirs] = [value(bench), value(server)];
    if (!same(ours, theirs)) return { kind: 'differ', quantity, bench: ours, server: theirs };
  }
  return { kind: 'agree' };
}
