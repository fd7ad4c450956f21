import type { Preferences } from '@/contract';
import { keep, recall } from './device-store';

const KEY = 'theme';
const themes: readonly unknown[] = ['system', 'light', 'dark'];

/** The theme this device showed last, for the moments before its reader is known. */
export function recallTheme(): Preferences['theme'] {
  const kept = recall(KEY);
  return themes.includes(kept) ? (kept as Preferences['theme']) : 'system';
}

export const rememberTheme = (theme: Preferences['theme']): void => keep(KEY, theme);
