/** What the product keeps on this device, under one prefix so that it can be shown and emptied. Where storage is closed, nothing is kept. */

const PREFIX = 'kerbline.';
const DRAFT = `${PREFIX}draft.`;

function withStorage<Result>(act: (storage: Storage) => Result, otherwise: Result): Result {
  try {
    return act(window.localStorage);
  } catch {
    return otherwise;
  }
}

export const keep = (key: string, value: unknown): void =>
  withStorage((storage) => storage.setItem(PREFIX + key, JSON.stringify(value)), undefined);

export const recall = (key: string): unknown =>
  withStorage((storage) => {
    const kept = storage.getItem(PREFIX + key);
    return kept === null ? null : JSON.parse(kept);
  }, null);

export const forget = (key: string): void => withStorage((storage) => storage.removeItem(PREFIX + key), undefined);

const draftKeys = (storage: Storage): string[] => Object.keys(storage).filter((key) => key.startsWith(DRAFT));

export const draftCount = (): number => withStorage((storage) => draftKeys(storage).length, 0);

export const forgetDrafts = (): void => withStorage((storage) => draftKeys(storage).forEach((key) => storage.removeItem(key)), undefined);
