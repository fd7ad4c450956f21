import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { formatGain } from '@/figures/format';
import { type Gain, gainWords } from '../draft/gain';
import type { GainMarks } from '../over/gain-marks';
import { BenchGainRule } from './bench-gain-rule';
import { CellNudge } from './cell-nudge';
import { GainInput } from './gain-input';
import { useGain } from './use-gain';

interface GainCellProps {
  gain: Gain;
  marks: GainMarks | undefined;
  onActive: (gain: Gain) => void;
}

/** One gain of the shelf: its rule, its field, and a step down and up. */
export const GainCell = memo(function GainCell({ gain, marks, onActive }: GainCellProps) {
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
      <BenchGainRule gain={gain} control={control} marks={marks} wide />
      <View style={styles.row}>
        <CellNudge label={label} direction="down" disabled={control.value === null} onNudge={control.nudge} />
        <GainInput key={control.form} gain={gain} control={control} />
        <CellNudge label={label} direction="up" disabled={control.value === null} onNudge={control.nudge} />
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
