import { type ChartSheet, chartSheets, sheetOfKey, sheetWords } from './sheets/chart-sheet';

export type BenchCommand =
  | { readonly kind: 'chart'; readonly sheet: ChartSheet }
  | { readonly kind: 'nudge'; readonly fraction: number }
  | { readonly kind: 'undo' | 'redo' | 'keep' };

/** What a key means on the bench, apart from whether it is listened to. */
type Key = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'altKey' | 'shiftKey'>;

const single: Readonly<Record<string, BenchCommand>> = {
  '[': { kind: 'nudge', fraction: -0.01 },
  ']': { kind: 'nudge', fraction: 0.01 },
  u: { kind: 'undo' },
  k: { kind: 'keep' },
};

/** The command of a key, or null. Single letters can be switched off; combinations with Ctrl or Cmd always work. */
export function commandOf({ key, ctrlKey, metaKey, altKey, shiftKey }: Key, singleKeys: boolean): BenchCommand | null {
  const letter = key.toLowerCase();
  if (ctrlKey || metaKey) {
    if (altKey) return null;
    if (letter === 'z') return { kind: shiftKey ? 'redo' : 'undo' };
    return letter === 'y' ? { kind: 'redo' } : null;
  }
  if (!singleKeys || altKey) return null;
  const sheet = sheetOfKey(letter);
  return sheet ? { kind: 'chart', sheet } : (single[letter] ?? null);
}

const fields = 'input, textarea, select, [contenteditable=true], [role=menu], dialog';

/** Whether a key pressed there is being typed. */
export const isTyping = (target: EventTarget | null): boolean => target instanceof Element && target.closest(fields) !== null;

/** Every key with what it does, as "All settings" lists them. */
export const keyList: readonly { readonly keys: string; readonly does: string }[] = [
  ...chartSheets.map((sheet) => ({ keys: sheetWords[sheet].key.toUpperCase(), does: `Show ${sheetWords[sheet].name}` })),
  { keys: '[ and ]', does: 'Move the active gain by 1 %' },
  { keys: 'U', does: 'Undo' },
  { keys: 'K', does: 'Keep' },
  { keys: 'Ctrl Z, Ctrl Shift Z', does: 'Undo, redo; they also work with single keys off' },
  { keys: 'Arrows up and down in a gain', does: 'Move by 1 %; with Shift 10 %, with Alt 0.1 %' },
  { keys: 'Arrows on a chart', does: 'Move the cursor; with Shift further' },
];
