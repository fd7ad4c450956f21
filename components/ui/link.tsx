import { type Href, Link as RouterLink } from 'expo-router';
import { StyleSheet } from 'react-native';
import { Text, type TextProps } from './text';

export interface LinkProps extends TextProps {
  href: Href;
  children: string;
}

/** Words that lead elsewhere. Underlined, with room for a finger round them. */
export function Link({ href, children, style, ...rest }: LinkProps) {
  return (
    <RouterLink href={href} asChild>
      <Text role="link" {...rest} style={StyleSheet.flatten([{ textDecorationLine: 'underline', paddingVertical: 12 }, style])}>
        {children}
      </Text>
    </RouterLink>
  );
}
