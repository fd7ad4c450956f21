import { useId, useState } from 'react';
import { StyleSheet, TextInput, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { corner, fonts, line } from '@/components/ui/tokens';
import { type Gain, gainWords } from '../draft/gain';
import { gainText } from './gain-text';
import { readGain } from './read-gain';
import type { GainControl } from './use-gain';

interface GainInputProps {
  gain: Gain;
  control: GainControl;
}

const stepOf = ({ shiftKey, altKey }: KeyboardEvent): number => (shiftKey ? 0.1 : altKey ? 0.001 : 0.01);

/**
 * A gain's field. What is typed counts at Enter or when the field is left, and one that is no number stays as typed with the
 * reason under it. Arrows up and down move by 1 %, with Shift 10 %, with Alt 0.1 %.
 */
export function GainInput({ gain, control }: GainInputProps) {
  const { form, value, unit } = control;
  const { colors } = useTheme();
  const problemId = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const { label, name } = gainWords(gain, form);

  const untouched = value === null ? '' : String(value);
  const forget = () => {
    setTyped(null);
    setProblem(null);
  };
  const settle = () => {
    if (typed === null || typed === untouched) return forget();
    const read = readGain(gain, form, typed);
    if ('problem' in read) return setProblem(read.problem);
    forget();
    if (read.value !== value) control.set(read.value);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') return settle();
    if (event.key === 'Escape') return forget();
    if (event.key !== 'ArrowUp' && event.key !== 'ArrowDown') return;
    event.preventDefault();
    settle();
    control.nudge(event.key === 'ArrowUp' ? stepOf(event) : -stepOf(event));
  };
  return (
    <View style={styles.box} onKeyDown={onKeyDown}>
      <TextInput
        aria-label={unit ? `${label}, ${name}, ${unit}` : `${label}, ${name}`}
        aria-invalid={problem !== null || undefined}
        aria-describedby={problem === null ? undefined : problemId}
        inputMode="decimal"
        value={typed ?? gainText(value)}
        onFocus={() => setTyped((before) => before ?? untouched)}
        selectTextOnFocus
        onChangeText={setTyped}
        onBlur={settle}
        style={[styles.input, { color: colors.ink, backgroundColor: colors.paper, borderColor: problem ? colors.fail : colors.rule2 }]}
      />
      {problem !== null && (
        <Text
          nativeID={problemId}
          role="alert"
          step="tick"
          tone="fail"
          numberOfLines={3}
          style={[styles.problem, { backgroundColor: colors.paper }]}
        >
          {problem}
        </Text>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { flex: 1, minWidth: 0 },
  input: {
    height: 44,
    borderWidth: line.field,
    borderRadius: corner,
    textAlign: 'center',
    fontFamily: fonts.narrow[600],
    fontSize: 22,
    width: '100%',
    minWidth: 0,
  },
  problem: { position: 'absolute', bottom: 46, left: 0, right: 0, textAlign: 'center' },
});
