import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

export interface ReadOutCell {
  name: string;
  value: string;
  unit?: string;
  design?: 'a' | 'b';
}

/** One barred line of values at the cursor, its place on the axis first. */
export function ReadOutLine({ place, cells }: { place: string; cells: readonly ReadOutCell[] }) {
  const { colors } = useTheme();
  return (
    <View style={[styles.line, { backgroundColor: colors.bar }]}>
      <View style={[styles.place, { backgroundColor: colors.ink }]}>
        <Text step="small" weight={600} tone="paper">
          {place}
        </Text>
      </View>
      {cells.map(({ name, value, unit = '', design = 'a' }) => (
        <Text key={name + design} step="small" tone={design === 'a' ? 'ink2' : 'b'} numberOfLines={1}>
          {name}{' '}
          <Text step="small" weight={600} tone={design === 'a' ? 'ink' : 'b'}>
            {value}
          </Text>
          {unit === '°' || unit === '' ? unit : ` ${unit}`}
        </Text>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: 32,
    paddingHorizontal: 12,
    paddingVertical: 4,
    columnGap: 12,
    overflow: 'hidden',
  },
  place: { paddingHorizontal: 6, paddingVertical: 2, borderRadius: 2 },
});
