import { useState } from 'react';
import type { ViewStyle } from 'react-native';
import { useTheme } from '@/components/ui/theme';

interface FocusRing {
  style: ViewStyle;
  onFocus: (event: { target: unknown }) => void;
  onBlur: () => void;
}

const isKeyboardFocus = (target: unknown): boolean => !(target instanceof Element) || target.matches(':focus-visible');

/** The ring round what has the keyboard: 3 px, 2 px off the edge. A touch or a click shows none. */
export function useFocusRing(): FocusRing {
  const { colors } = useTheme();
  const [focused, setFocused] = useState(false);
  return {
    style: focused
      ? { outlineColor: colors.focus, outlineStyle: 'solid', outlineWidth: 3, outlineOffset: 2 }
      : { outlineStyle: 'solid', outlineWidth: 0 },
    onFocus: ({ target }) => setFocused(isKeyboardFocus(target)),
    onBlur: () => setFocused(false),
  };
}
