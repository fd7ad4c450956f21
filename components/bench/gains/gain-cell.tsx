import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { IconButton } from '@/components/ui/icon-button';
import { Text } from '@/components/ui/text';
import { formatGain } from '@/figures/format';
import { type Gain, gainWords } from '../draft/gain';
import type { StabilitySpan } from '../live/stability-span';
import { BenchGainRule } from './bench-gain-rule';
import { GainInput } from './gain-input';
import { useGain } from './use-gain';

interface GainCellProps {
  gain: Gain;
  unstable: StabilitySpan | undefined;
  onActive: (gain: Gain) => void;
}

/** One gain of the shelf: its rule, its field, and a step down and up. */
export const GainCell = memo(function GainCell({ gain, unstable, onActive }: GainCellProps) {
  const control = useGain(gain);
  const { label } = gainWords(gain, control.form);
  return (
    <View style={styles.cell} onFocus={() => onActive(gain)}>
      <View style={styles.head}>
        <Text step="h3">{label}</Text>
        <Text step="small" tone="ink2" numberOfLines={1}>
          {control.unit}
        </Text>
        {control.moved && control.kept !== null && (
          <Text step="small" tone="ink2" style={styles.was}>
            was {formatGain(control.kept)}
          </Text>
        )}
      </View>
      <BenchGainRule gain={gain} control={control} unstable={unstable} wide />
      <View style={styles.row}>
        <IconButton
          icon="minus"
          outlined
          label={`${label} down 1 %`}
          disabled={control.value === null}
          onPress={() => control.nudge(-0.01)}
        />
        <GainInput key={control.form} gain={gain} control={control} />
        <IconButton icon="plus" outlined label={`${label} up 1 %`} disabled={control.value === null} onPress={() => control.nudge(0.01)} />
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  cell: { flex: 1, minWidth: 0, paddingHorizontal: 14, paddingTop: 8, paddingBottom: 10 },
  head: { flexDirection: 'row', alignItems: 'baseline', gap: 7, height: 21 },
  was: { marginLeft: 'auto' },
  row: { flexDirection: 'row', alignItems: 'center', gap: 6 },
});
