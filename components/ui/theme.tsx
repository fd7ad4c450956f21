import { createContext, type PropsWithChildren, useContext, useEffect, useMemo } from 'react';
import { useColorScheme } from 'react-native';
import type { Preferences } from '@/contract';
import { type Palette, palettes, type ThemeName } from './tokens';

export interface Theme {
  name: ThemeName;
  colors: Palette;
}

const ThemeContext = createContext<Theme>({ name: 'light', colors: palettes.light });

/** Gives the palette that was chosen by hand, or the system's where `preference` is "system". Light where the system has no wish. */
export function ThemeProvider({ preference, children }: PropsWithChildren<{ preference: Preferences['theme'] }>) {
  const system = useColorScheme() === 'dark' ? 'dark' : 'light';
  const name = preference === 'system' ? system : preference;
  const theme = useMemo(() => ({ name, colors: palettes[name] }), [name]);
  useEffect(() => {
    document.documentElement.dataset.theme = name;
  }, [name]);
  return <ThemeContext.Provider value={theme}>{children}</ThemeContext.Provider>;
}

export const useTheme = (): Theme => useContext(ThemeContext);
