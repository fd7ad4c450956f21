import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';
import { corner, line } from './tokens';

/** What is not there yet, what it is for, and the one thing to do about it. */
export function Empty({ title, text, action }: { title: string; text: string; action?: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View style={[styles.box, { borderColor: colors.rule2, backgroundColor: colors.paper }]}>
      <Text step="h3">{title}</Text>
      <Text step="note" tone="ink2">
        {text}
      </Text>
      {action ? <View style={styles.action}>{action}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderWidth: line.field, borderStyle: 'dashed', borderRadius: corner, padding: 18, gap: 4 },
  action: { paddingTop: 10, alignItems: 'flex-start' },
});
