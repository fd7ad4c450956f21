import { describe, expect, it } from 'vitest';
import { agreementOf } from '@/components/bench/keep/agreement';
import type { Analysis } from '@/contract';

const numbers = ({ ms = 1.5598, phase = 45.319 as number | null, unstablePoles = 0 } = {}) =>
  ({
    closedLoop: { stable: unstablePoles === 0, unstablePoles },
    sensitivity: { ms: { value: ms } },
    margins: { phase: phase === null ? null : { degrees: phase }, gain: { factor: 11.681 }, delay: { seconds: 0.38416 } },
  }) as unknown as Analysis;

describe('server and bench', () => {
  it('agree where six digits are the same', () =>
    expect(agreementOf(numbers(), numbers({ ms: 1.5598 * (1 + 4e-7) }))).toEqual({ kind: 'agree' }));

  it('differ where the sixth digit differs', () => {
    expect(agreementOf(numbers(), numbers({ ms: 1.55981 }))).toEqual({ kind: 'differ', quantity: 'ms', bench: 1.5598, server: 1.55981 });
  });

  it('differ where only one of them has a margin', () => {
    expect(agreementOf(numbers({ phase: null }), numbers())).toMatchObject({ kind: 'differ', quantity: 'phaseMargin', bench: null });
  });

  it('differ in stability before anything else', () => {
    expect(agreementOf(numbers({ unstablePoles: 2 }), numbers({ ms: 3 }))).toMatchObject({ quantity: 'stability', bench: 2, server: 0 });
  });
});
