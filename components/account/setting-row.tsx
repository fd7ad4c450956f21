import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

/** One setting: its name and what it means at the left, what changes it at the right. */
export function SettingRow({ name, about, children }: PropsWithChildren<{ name: string; about?: string }>) {
  const { colors } = useTheme();
  return (
    <View style={[styles.row, { borderBottomColor: colors.rule }]}>
      <View style={styles.text}>
        <Text weight={600}>{name}</Text>
        {about ? (
          <Text step="note" tone="ink2">
            {about}
          </Text>
        ) : null}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', flexWrap: 'wrap', gap: 8, minHeight: 60, paddingVertical: 8, borderBottomWidth: 1 },
  text: { flex: 1, minWidth: 120, gap: 2 },
});
