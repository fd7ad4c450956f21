import type { Preferences } from '@/contract';

const KEY = 'kerbline.theme';
const themes: readonly string[] = ['system', 'light', 'dark'];

/** The theme this device showed last, for the moments before its reader is known; storage may be closed to us. */
export function recallTheme(): Preferences['theme'] {
  try {
    const kept = localStorage.getItem(KEY);
    return kept !== null && themes.includes(kept) ? (kept as Preferences['theme']) : 'system';
  } catch {
    return 'system';
  }
}

export function rememberTheme(theme: Preferences['theme']): void {
  try {
    localStorage.setItem(KEY, theme);
  } catch {
    // A device that keeps nothing shows the system's theme until its reader is known.
  }
}
