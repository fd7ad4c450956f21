import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { Room } from '@/contract';
import { roomLines, roomSentence } from './room-lines';

interface RoomBlockProps {
  room: Room | 'sought';
  /** The case that stands beside already: only another one is named. */
  besideCase?: string;
}

function useRoomLines({ room, besideCase }: RoomBlockProps) {
  const lines = roomLines(room, useUnits());
  return lines.map((line) => ({ ...line, caseName: line.caseName === besideCase ? null : line.caseName }));
}

/** How much more gain, less gain and dead time the loop takes before the first limit breaks, and which. */
export function RoomBlock(props: RoomBlockProps) {
  const lines = useRoomLines(props);
  return (
    <View role="group" aria-label="Room" style={styles.block}>
      <Text step="small" tone="ink2">
        Room
      </Text>
      {lines.map(({ way, change, before, caseName }) => (
        <View key={way} style={styles.line}>
          <Text step="small" weight={600}>
            {change}
          </Text>
          <Text step="small" tone="ink2" style={styles.before}>
            {[before, caseName].filter(Boolean).join(', ')}
          </Text>
        </View>
      ))}
    </View>
  );
}

/** The same in one running sentence, for a phone. It keeps the height of its two lines while it is looked for. */
export function RoomSentence(props: RoomBlockProps) {
  const lines = useRoomLines(props);
  const looking = props.room === 'sought';
  return (
    <Text step="note" tone="ink2" style={styles.sentence}>
      <Text step="note" weight={600}>
        Room{' '}
      </Text>
      {looking ? 'is looked for …' : roomSentence(lines)}
    </Text>
  );
}

const styles = StyleSheet.create({
  block: { gap: 1 },
  line: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 8 },
  before: { flexShrink: 1 },
  sentence: { minHeight: 38 },
});
