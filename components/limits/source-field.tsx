import { StyleSheet, TextInput } from 'react-native';
import { useChartFrame } from '@/components/charts/use-chart-frame';
import { useTheme } from '@/components/ui/theme';
import { corner, fonts, line, touch } from '@/components/ui/tokens';
import { textWidth } from '@/figures';

export interface SourceFieldProps {
  label: string;
  text: string;
  onChange: (text: string) => void;
}

const INSET = 8;
const SIZE = 15;
/** As many characters as the contract keeps of it. */
const LONGEST = 120;

/** Where a demand comes from, in two lines at most; it stays one line of text. */
export function SourceField({ label, text, onChange }: SourceFieldProps) {
  const { colors } = useTheme();
  const { width, onLayout } = useChartFrame();
  const two = textWidth(text, SIZE) > width - 2 * INSET;
  return (
    <TextInput
      aria-label={label}
      multiline
      onLayout={onLayout}
      numberOfLines={2}
      maxLength={LONGEST}
      value={text}
      placeholder="source"
      placeholderTextColor={colors.ink3}
      onChangeText={(next) => onChange(next.replace(/\s*\n\s*/g, ' '))}
      style={[styles.input, two ? styles.two : styles.one, { color: colors.ink, borderColor: colors.rule2, backgroundColor: colors.paper }]}
    />
  );
}

const styles = StyleSheet.create({
  one: { paddingVertical: 11 },
  two: { paddingVertical: 3.5 },
  input: {
    width: '100%',
    height: touch,
    paddingHorizontal: INSET,
    borderWidth: line.field,
    borderRadius: corner,
    fontFamily: fonts.narrow[500],
    fontSize: SIZE,
    lineHeight: 18,
  },
});
