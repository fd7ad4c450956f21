import type { PropsWithChildren } from 'react';
import { type StyleProp, View, type ViewStyle } from 'react-native';
import { useTheme } from './theme';
import { gutter } from './tokens';
import { useLayout } from './use-layout';

/** A sheet of paper on the desk. `flush` where its rows reach its edges. */
export function Paper({ flush = false, style, children }: PropsWithChildren<{ flush?: boolean; style?: StyleProp<ViewStyle> }>) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const padding = flush ? 0 : phone ? gutter.phone : gutter.wide;
  return <View style={[{ backgroundColor: colors.paper, padding }, style]}>{children}</View>;
}
