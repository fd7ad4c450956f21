import { describe, expect, it } from 'vitest';
import { current, isMoved, type KeptBase, movesSinceKept } from '@/components/bench/draft/draft';
import { createDraftStore, meetNewest, redo, undo } from '@/components/bench/draft/draft-store';
import { isOvertaken } from '@/components/bench/draft/meet-latest';
import { changeWords } from '@/components/bench/draft/draft-words';
import { switchedTo } from '@/components/bench/draft/form';
import { startSettings } from '@/components/bench/draft/settings';

const rev = (revision: number, kp: number): KeptBase => ({ revision, settings: { ...startSettings, kp } });

function memory(): Storage & { refuse: boolean } {
  const items = new Map<string, string>();
  return {
    refuse: false,
    length: 0,
    key: () => null,
    clear: () => items.clear(),
    getItem: (key) => items.get(key) ?? null,
    removeItem: (key) => void items.delete(key),
    setItem(key, value) {
      if (this.refuse) throw new DOMException('full', 'QuotaExceededError');
      items.set(key, value);
    },
  };
}

const open = (latest: KeptBase, storage: Storage | null = memory()) => createDraftStore({ key: 'draft', latest, storage });

describe('a gesture', () => {
  it('is one step of undo however many pixels it has', () => {
    const store = open(rev(6, 1));
    for (let kp = 1.01; kp < 1.5; kp += 0.01) store.getState().hold({ kp });
    store.getState().release();
    expect(store.temporal.getState().pastStates).toHaveLength(1);
    undo(store);
    expect(current(store.getState()).kp).toBe(1);
    redo(store);
    expect(current(store.getState()).kp).toBeCloseTo(1.49);
  });

  it('that came back to where it began leaves no step', () => {
    const store = open(rev(6, 1));
    store.getState().hold({ kp: 2 });
    store.getState().hold({ kp: 1 });
    store.getState().release();
    expect(store.temporal.getState().pastStates).toHaveLength(0);
  });

  it('under way is what undo takes back', () => {
    const store = open(rev(6, 1));
    store.getState().hold({ kp: 2 });
    undo(store);
    expect(current(store.getState()).kp).toBe(1);
    expect(store.getState().held).toBeNull();
  });

  it('on the form or the filters is taken back as one too', () => {
    const pid = { ...startSettings, kp: 1.05, integral: 0.42, derivative: 0.3, filterTime: 0.035 };
    const store = open({ revision: 6, settings: pid });
    const ideal = switchedTo('ideal', pid, pid);
    if ('gains' in ideal) store.getState().move(ideal.gains);
    expect(isMoved(store.getState())).toBe(true);
    const filtered = { ...store.getState().settings, filters: [{ kind: 'lowPass' as const, timeConstant: 0.02 }] };
    store.getState().move(filtered);
    expect(changeWords(filtered, pid)).toBe('Form, Filters');
    undo(store);
    expect(changeWords(current(store.getState()), pid)).toBe('Form ideal to parallel');
    undo(store);
    expect(current(store.getState())).toEqual(pid);
    expect(isMoved(store.getState())).toBe(false);
  });

  it('can be taken back a hundred times', () => {
    const store = open(rev(6, 0));
    for (let kp = 1; kp <= 130; kp++) store.getState().move({ kp });
    for (let n = 0; n < 130; n++) undo(store);
    expect(store.getState().settings.kp).toBe(30);
  });
});

describe('moves since the kept revision', () => {
  it('count gestures, and undo counts back', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    store.getState().move({ integral: 1 });
    expect(movesSinceKept(store.getState())).toBe(2);
    undo(store);
    expect(movesSinceKept(store.getState())).toBe(1);
  });

  it('are none where the kept values were reached by hand', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    store.getState().move({ kp: 1 });
    expect(movesSinceKept(store.getState())).toBe(0);
    expect(isMoved(store.getState())).toBe(false);
  });

  it('start again from zero when kept, and undo leads back past it', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    store.getState().keep(rev(7, 2));
    expect(movesSinceKept(store.getState())).toBe(0);
    undo(store);
    expect(store.getState().settings.kp).toBe(1);
    expect(movesSinceKept(store.getState())).toBe(1);
  });

  it('made while keeping was under way stay a draft', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    store.getState().move({ kp: 3 });
    store.getState().keep(rev(7, 2));
    expect(isMoved(store.getState())).toBe(true);
    expect(store.getState().settings.kp).toBe(3);
  });
});

describe('a draft on this device', () => {
  it('is found again after a reload, with its history', () => {
    const storage = memory();
    const before = open(rev(6, 1), storage);
    before.getState().move({ kp: 2 });
    before.getState().move({ kp: 3 });
    const after = open(rev(6, 1), storage);
    expect(after.getState().settings.kp).toBe(3);
    expect(movesSinceKept(after.getState())).toBe(2);
    undo(after);
    expect(after.getState().settings.kp).toBe(2);
  });

  it('is forgotten where it equals the kept revision', () => {
    const storage = memory();
    const store = open(rev(6, 1), storage);
    store.getState().move({ kp: 2 });
    undo(store);
    expect(storage.getItem('draft')).toBeNull();
  });

  it('is forgotten where someone kept the same values meanwhile', () => {
    const storage = memory();
    open(rev(6, 1), storage).getState().move({ kp: 2 });
    const after = open(rev(7, 2), storage);
    expect(isMoved(after.getState())).toBe(false);
    expect(after.getState().base.revision).toBe(7);
    expect(storage.getItem('draft')).toBeNull();
  });

  it('moved from an older revision is kept and known to be overtaken', () => {
    const storage = memory();
    open(rev(6, 1), storage).getState().move({ kp: 2 });
    const after = open(rev(8, 5), storage);
    expect(after.getState().settings.kp).toBe(2);
    expect(isOvertaken(after.getState(), 8)).toBe(true);
    after.getState().rebase(rev(8, 5));
    expect(isOvertaken(after.getState(), 8)).toBe(false);
    expect(after.getState().settings.kp).toBe(2);
  });

  it('given up for a newer revision can be had back', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    store.getState().take(rev(8, 5));
    expect(isMoved(store.getState())).toBe(false);
    undo(store);
    expect(store.getState().settings.kp).toBe(2);
  });

  it('lives in the page where the device refuses to write', () => {
    const storage = memory();
    storage.refuse = true;
    const store = open(rev(6, 1), storage);
    store.getState().move({ kp: 2 });
    expect(store.getState().settings.kp).toBe(2);
    expect(store.getState().stored).toBe(false);
    expect(() => open(rev(6, 1), null).getState().move({ kp: 2 })).not.toThrow();
  });

  it('finds filters and form again, and no move in filters that equal the kept ones', () => {
    const storage = memory();
    const settings = {
      ...startSettings,
      form: 'ideal' as const,
      integral: null,
      filters: [{ kind: 'lowPass' as const, timeConstant: 0.02 }],
    };
    open(rev(6, 1), storage).getState().move(settings);
    expect(open(rev(6, 1), storage).getState().settings).toEqual(settings);
    const kept = { revision: 7, settings: { ...settings, filters: [{ timeConstant: 0.02, kind: 'lowPass' as const }] } };
    expect(isMoved(open(kept, storage).getState())).toBe(false);
  });

  it('written before there were forms is none', () => {
    const storage = memory();
    const old = { kp: 2, ki: 1, kd: 0, filterTime: 0, proportionalWeight: 1, derivativeWeight: 0, feedforward: 0, statedContinuous: false };
    const place = { settings: old, step: 1 };
    storage.setItem('draft', JSON.stringify({ base: { revision: 6, settings: old }, baseStep: 0, place, note: '', past: [], future: [] }));
    const store = open(rev(6, 1), storage);
    expect(store.getState().settings).toEqual(rev(6, 1).settings);
    expect(isMoved(store.getState())).toBe(false);
  });

  it('that is not readable is left alone', () => {
    const storage = memory();
    storage.setItem('draft', '{"base": 3');
    expect(open(rev(6, 1), storage).getState().settings.kp).toBe(1);
  });
});

describe('a newer revision seen while the bench is open', () => {
  it('is followed by an unmoved draft', () => {
    const store = open(rev(6, 1));
    meetNewest(store, rev(7, 4));
    expect(store.getState().settings.kp).toBe(4);
    expect(movesSinceKept(store.getState())).toBe(0);
  });

  it('leaves a moved draft as it is', () => {
    const store = open(rev(6, 1));
    store.getState().move({ kp: 2 });
    meetNewest(store, rev(7, 4));
    expect(store.getState().settings.kp).toBe(2);
    expect(store.getState().base.revision).toBe(6);
  });
});
