import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { Room } from '@/contract';
import { roomLines } from './room-lines';

interface RoomBlockProps {
  room: Room | 'sought';
  /** The case that stands beside already: only another one is named. */
  besideCase?: string;
  /** On a phone each way is one running line. */
  compact?: boolean;
}

/** How much more gain, less gain and dead time the loop takes before the first limit breaks, and which. */
export function RoomBlock({ room, besideCase, compact = false }: RoomBlockProps) {
  const lines = roomLines(room, useUnits());
  return (
    <View role="group" aria-label="Room" style={compact ? styles.compact : styles.block}>
      {compact ? null : (
        <Text step="small" tone="ink2">
          Room
        </Text>
      )}
      {lines.map(({ way, change, before, caseName }) => (
        <View key={way} style={styles.line}>
          <Text step="note" weight={600}>
            {change}
          </Text>
          <Text step="note" tone="ink2" style={styles.before}>
            {[before, caseName === besideCase ? null : caseName].filter(Boolean).join(', ')}
          </Text>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  block: { gap: 1 },
  compact: { gap: 2 },
  line: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 8 },
  before: { flexShrink: 1 },
});
