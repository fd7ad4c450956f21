import { useEffect, useMemo, useState } from 'react';
import type { DesignRevision } from '@/contract';
import type { BenchSubject } from '../subject/bench-subject';
import type { KeptBase } from './draft';
import { deviceStorage, draftKey } from './draft-storage';
import { createDraftStore, type DraftStore, meetNewest } from './draft-store';
import { settingsOf, startSettings } from './settings';

const baseOf = (revision: DesignRevision | null): KeptBase => ({
  revision: revision?.revision ?? null,
  settings: revision ? settingsOf(revision) : startSettings,
});

/** The store lives as long as its key: a newer revision is met by the same draft. */
function useStoreOf(key: string, base: KeptBase): DraftStore {
  const open = () => ({ key, store: createDraftStore({ key, latest: base, storage: deviceStorage() }) });
  const [opened, setOpened] = useState(open);
  if (opened.key === key) return opened.store;
  const next = open();
  setOpened(next);
  return next.store;
}

/** The draft of what was opened. It follows newer revisions while nothing is moved, unless a link pinned one. */
export function useDraftStore({ project, opened, pinned }: BenchSubject): DraftStore {
  const key = draftKey(project.id, opened && (pinned ? `${opened.id}@${opened.revision}` : opened.id));
  const base = useMemo(() => baseOf(opened), [opened]);
  const store = useStoreOf(key, base);
  useEffect(() => {
    if (base.revision !== null && !pinned) meetNewest(store, base);
  }, [store, base, pinned]);
  useEffect(() => {
    const finish = () => store.getState().release();
    window.addEventListener('pagehide', finish);
    return () => window.removeEventListener('pagehide', finish);
  }, [store]);
  return store;
}
