import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { type Gain, gainWords } from '../draft/gain';
import { gainText } from './gain-text';
import { NudgeButton } from './nudge-button';
import type { GainControl } from './use-gain';

interface NudgeRowProps {
  gain: Gain;
  control: GainControl;
  onEnter: () => void;
}

/** The value between its nudges; a tap on it opens the keypad. */
export function NudgeRow({ gain, control, onEnter }: NudgeRowProps) {
  const { label } = gainWords(gain, control.form);
  const nudge = (percent: number) => (
    <NudgeButton gainLabel={label} percent={percent} disabled={control.value === null} onNudge={control.nudge} />
  );
  return (
    <View style={styles.row}>
      {nudge(-10)}
      {nudge(-1)}
      <Pressable
        role="button"
        aria-label={`${label} ${gainText(control.value)} ${control.unit}, enter a number`}
        onPress={onEnter}
        style={styles.value}
      >
        <Text step="big" style={styles.number} numberOfLines={1}>
          {gainText(control.value)}
        </Text>
        <Text step="tick" tone="ink2" numberOfLines={1}>
          {control.value === null ? '' : control.unit || 'factor'}
        </Text>
      </Pressable>
      {nudge(1)}
      {nudge(10)}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: 6, alignItems: 'center' },
  value: { flex: 1, minHeight: 52, alignItems: 'center', justifyContent: 'center', gap: 2 },
  number: { fontSize: 26, lineHeight: 28 },
});
