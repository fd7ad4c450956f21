import { Text as NativeText, type TextProps as NativeTextProps } from 'react-native';
import { useTheme } from './theme';
import { fonts, type Palette, type as steps, type TypeStep } from './tokens';

export interface TextProps extends NativeTextProps {
  step?: TypeStep;
  tone?: keyof Palette;
  weight?: keyof typeof fonts.narrow;
}

/** Words in one step of the type scale and one role of the palette. */
export function Text({ step = 'body', tone = 'ink', weight, style, ...rest }: TextProps) {
  const { colors } = useTheme();
  const heavier = weight && { fontFamily: fonts.narrow[weight] };
  return <NativeText {...rest} style={[steps[step], { color: colors[tone] }, heavier, style]} />;
}

/** A heading of the page's outline; how large it is set is another matter than its level. */
export function Heading({ level, step, ...rest }: TextProps & { level: 1 | 2 | 3 }) {
  return <Text role="heading" aria-level={level} step={step ?? `h${level}`} {...rest} />;
}
