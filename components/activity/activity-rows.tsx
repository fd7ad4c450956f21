import { StyleSheet, View } from 'react-native';
import { moment } from '@/components/ui/moment';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { Activity } from '@/contract';

export interface ActivityRowsProps {
  items: readonly Activity[];
  /** With the time of day also where a row is not of today. */
  withClock?: boolean;
}

/** Who did what, newest first. */
export function ActivityRows({ items, withClock = false }: ActivityRowsProps) {
  const { colors } = useTheme();
  const now = new Date();
  return (
    <View role="list">
      {items.map(({ id, at, by, summary, detail }) => (
        <View key={id} role="listitem" style={[styles.row, { borderBottomColor: colors.rule }]}>
          <Text step="note" tone="ink2" style={withClock ? styles.moment : styles.when}>
            {moment(at, now, withClock)}
          </Text>
          <View style={styles.what}>
            <Text weight={600}>{`${by} ${summary}`}</Text>
            {detail ? (
              <Text step="note" tone="ink2">
                {detail}
              </Text>
            ) : null}
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: 10, paddingVertical: 10, borderBottomWidth: 1 },
  when: { width: 76 },
  moment: { width: 132 },
  what: { flex: 1, gap: 2 },
});
