import { describe, expect, it } from 'vitest';
import { besideByDefault } from '@/components/bench/compare/use-compared';
import { freshDraft, moved } from '@/components/bench/draft/draft';
import { changeWords } from '@/components/bench/draft/draft-words';
import { startSettings } from '@/components/bench/draft/settings';
import { keepWords } from '@/components/bench/keep/keep-outcome';
import { nextRevision, savedWords, whyNotKept } from '@/components/bench/keep/saved-words';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;

describe('what stands of the draft', () => {
  const kept = freshDraft({ revision: 6, settings: startSettings });
  it('is kept', () => expect(savedWords(kept)).toEqual({ state: 'Kept', detail: 'rev 6' }));
  it('is not kept, with the moves counted', () => {
    const once = moved(kept, { kp: 2 });
    expect(savedWords(once).detail).toBe('1 move since rev 6');
    expect(savedWords(moved(once, { integral: 1 }))).toEqual({ state: 'Not kept', detail: '2 moves since rev 6' });
  });
  it('is not kept where the project has no design', () => {
    expect(savedWords(freshDraft({ revision: null, settings: startSettings }))).toEqual({ state: 'Not kept', detail: 'no design yet' });
  });
});

describe('what became of keeping', () => {
  it('says that server and bench agree', () => {
    expect(keepWords({ kind: 'kept', revision: 7, agreement: { kind: 'agree' } }, units)).toEqual({
      lead: 'Kept as rev 7.',
      text: 'Server and bench agree to 6 digits.',
    });
  });

  it('says in which number they differ', () => {
    const agreement = { kind: 'differ', quantity: 'ms', bench: 1.591, server: 1.64 } as const;
    expect(keepWords({ kind: 'kept', revision: 7, agreement }, units)?.text).toContain('differ: Ms 1.64 and 1.59.');
  });

  it('prints all digits where the printed ones would hide the difference', () => {
    const agreement = { kind: 'differ', quantity: 'ms', bench: 1.59101, server: 1.59102 } as const;
    expect(keepWords({ kind: 'kept', revision: 7, agreement }, units)?.text).toContain('Ms 1.59102 and 1.59101');
  });

  it('says that the draft stays where there is no signal', () =>
    expect(keepWords({ kind: 'offline' }, units)?.text).toContain('stays on this device'));
  it('has nothing to say while nothing happened', () => expect(keepWords({ kind: 'idle' }, units)).toBeNull());
});

describe('keeping', () => {
  it('is for owners and editors', () => {
    const refused = (archived: boolean) =>
      (['owner', 'editor', 'reviewer', 'viewer'] as const).map((role) => whyNotKept({ role, archived }) !== null);
    expect(refused(false)).toEqual([false, false, true, true]);
    expect(refused(true)).toEqual([true, true, true, true]);
  });
  it('counts from the newest revision', () => expect([nextRevision(null), nextRevision(6)]).toEqual([1, 7]));
});

describe('a step of the history', () => {
  it('is named after the gain that it changes', () => {
    expect(changeWords({ ...startSettings, kp: 1.05 }, startSettings)).toBe('Kp 1.05 to 1.00');
  });
  it('of several settings names them', () => expect(changeWords({ ...startSettings, kp: 2, integral: 1 }, startSettings)).toBe('Kp, Ki'));
});

describe('what lies beside when nobody chose', () => {
  it('is the revision before', () => expect([besideByDefault(null), besideByDefault(1), besideByDefault(6)]).toEqual([null, null, 5]));
});
