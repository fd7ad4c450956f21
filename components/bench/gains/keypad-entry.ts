export type KeypadKey = '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9' | '.' | 'sign' | 'erase';

const LONGEST = 12;
const MINUS = '\u2212';

/** What has been typed; `untouched` while it is still the value that stood there, which the first digit replaces. */
export interface Entry {
  readonly text: string;
  readonly untouched: boolean;
}

export const entryOf = (value: number | null): Entry => ({
  text: value === null ? '' : String(value).replace('-', MINUS),
  untouched: true,
});

const toggled = (text: string): string => (text.startsWith(MINUS) ? text.slice(1) : MINUS + text);

/** The entry after a key. Keys that would make it no number (a second point, a thirteenth character) change nothing. */
export function pressed(entry: Entry, key: KeypadKey): Entry {
  if (key === 'sign') return { text: toggled(entry.text), untouched: false };
  if (key === 'erase') return { text: entry.untouched ? '' : entry.text.slice(0, -1), untouched: false };
  const before = entry.untouched ? '' : entry.text;
  if (before.length >= LONGEST || (key === '.' && before.includes('.'))) return entry;
  const bare = before === '' || before === MINUS;
  return { text: before + (key === '.' && bare ? '0.' : key), untouched: false };
}

/** The keypad's key for a key of a keyboard; null where it has none. */
export function keypadKeyOf(key: string): KeypadKey | null {
  if (/^[0-9.]$/.test(key)) return key as KeypadKey;
  if (key === 'Backspace' || key === 'Delete') return 'erase';
  return key === '-' ? 'sign' : null;
}
