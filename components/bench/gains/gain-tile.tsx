import { memo } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { Gain } from '../draft/gain';
import { gainText } from './gain-text';

interface GainTileProps {
  gain: Gain;
  label: string;
  value: number | null;
  moved: boolean;
  active: boolean;
  onChoose: (gain: Gain) => void;
}

/** A gain's name and value; the dot says that it was moved since it was kept. The active one is the one that rule and nudges move. */
export const GainTile = memo(function GainTile({ gain, label, value, moved, active, onChoose }: GainTileProps) {
  const { colors } = useTheme();
  return (
    <Pressable
      role="radio"
      aria-checked={active}
      tabIndex={active ? 0 : -1}
      aria-label={`${label} ${gainText(value)}${moved ? ', moved' : ''}`}
      onPress={() => onChoose(gain)}
      style={[styles.tile, active && { backgroundColor: colors.paper }]}
    >
      {active && <View style={[styles.mark, { backgroundColor: colors.ink }]} />}
      <View style={styles.name}>
        <Text step="small" tone={active ? 'ink' : 'ink2'}>
          {label}
        </Text>
        {moved && <View style={[styles.dot, { backgroundColor: colors.ink }]} />}
      </View>
      <Text step="value" style={styles.value} numberOfLines={1}>
        {gainText(value)}
      </Text>
    </Pressable>
  );
});

const styles = StyleSheet.create({
  tile: { flex: 1, minHeight: 54, paddingTop: 7, paddingBottom: 6, paddingLeft: 12, paddingRight: 6, gap: 2 },
  mark: { position: 'absolute', top: 0, left: 0, right: 0, height: 4 },
  name: { flexDirection: 'row', alignItems: 'center', gap: 4 },
  dot: { width: 7, height: 7, borderRadius: 4 },
  value: { fontSize: 20, lineHeight: 22 },
});
