/// <reference types="expo/types" />
import 'react-native';

/** What react-native-web hands to the browser and React Native's own types do not name. */
declare module 'react-native' {
  interface AccessibilityProps {
    'aria-colspan'?: number;
    'aria-controls'?: string;
    'aria-current'?: 'page' | 'true' | undefined;
    'aria-describedby'?: string;
    'aria-errormessage'?: string;
    'aria-haspopup'?: 'menu' | 'dialog';
    'aria-invalid'?: boolean;
    'aria-level'?: number;
    'aria-pressed'?: boolean;
    'aria-required'?: boolean;
  }
  interface PressableProps {
    href?: string;
    onKeyDown?: (event: KeyboardEvent) => void;
    tabIndex?: 0 | -1;
  }
  interface ViewProps {
    onKeyDown?: (event: KeyboardEvent) => void;
  }
}
