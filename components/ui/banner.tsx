import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { Text } from './text';
import { useTheme } from './theme';

export interface BannerProps {
  lead?: string;
  text: string;
  icon?: IconName;
  action?: ReactNode;
}

/** One barred line that says what changed or what is assumed; read out politely when it appears. */
export function Banner({ lead, text, icon, action }: BannerProps) {
  const { colors } = useTheme();
  return (
    <View role="status" style={[styles.bar, { backgroundColor: colors.bar }]}>
      {icon && <Icon name={icon} size={18} />}
      <Text step="note" tone="ink2" style={styles.text}>
        {lead ? (
          <Text step="note" weight={600}>
            {lead}{' '}
          </Text>
        ) : null}
        {text}
      </Text>
      {action}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { flexDirection: 'row', alignItems: 'center', gap: 12, paddingHorizontal: 12, paddingVertical: 8 },
  text: { flex: 1, paddingVertical: 3 },
});
