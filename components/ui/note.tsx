import type { PropsWithChildren } from 'react';
import { View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';

/** A remark in the margin: an ink bar at the left, `lead` in bold, the rest beside it. */
export function Note({ lead, children }: PropsWithChildren<{ lead?: string }>) {
  const { colors } = useTheme();
  return (
    <View style={{ borderLeftWidth: 4, borderLeftColor: colors.ink, paddingLeft: 12, paddingVertical: 2 }}>
      <Text step="note" tone="ink2">
        {lead ? (
          <Text step="note" weight={600}>
            {lead}{' '}
          </Text>
        ) : null}
        {children}
      </Text>
    </View>
  );
}
