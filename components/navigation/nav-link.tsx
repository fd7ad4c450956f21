import { type Href, Link } from 'expo-router';
import type { PropsWithChildren } from 'react';
import { Pressable, type PressableProps, type StyleProp, StyleSheet, type ViewStyle } from 'react-native';

export interface NavLinkProps extends Pick<PressableProps, 'aria-label' | 'aria-current' | 'onPress'> {
  href: Href;
  style: StyleProp<ViewStyle>;
  /** A step beside the others rather than a step further: going back then leaves the project. */
  replace?: boolean;
}

/**
 * A real link with a face of its own: it can be opened in a new tab, and it is walked to by the router otherwise. Its style is one object, since the
 * router spreads it.
 */
export function NavLink({ href, replace, style, children, ...rest }: PropsWithChildren<NavLinkProps>) {
  return (
    <Link href={href} replace={replace} asChild>
      <Pressable role="link" {...rest} style={StyleSheet.flatten(style)}>
        {children}
      </Pressable>
    </Link>
  );
}
