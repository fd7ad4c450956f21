import { StyleSheet, TextInput } from 'react-native';
import { useTheme } from '@/components/ui/theme';
import { corner, fonts, line, touch } from '@/components/ui/tokens';

export interface SourceFieldProps {
  label: string;
  text: string;
  onChange: (text: string) => void;
}

/** As many characters as the contract keeps of it. */
const LONGEST = 120;

/** Where a demand comes from, in two lines at most; it stays one line of text. */
export function SourceField({ label, text, onChange }: SourceFieldProps) {
  const { colors } = useTheme();
  return (
    <TextInput
      aria-label={label}
      multiline
      numberOfLines={2}
      maxLength={LONGEST}
      value={text}
      placeholder="source"
      placeholderTextColor={colors.ink3}
      onChangeText={(next) => onChange(next.replace(/\s*\n\s*/g, ' '))}
      style={[styles.input, { color: colors.ink, borderColor: colors.rule2, backgroundColor: colors.paper }]}
    />
  );
}

const styles = StyleSheet.create({
  input: {
    flex: 1,
    minWidth: 0,
    height: touch,
    paddingHorizontal: 8,
    paddingVertical: 3,
    borderWidth: line.field,
    borderRadius: corner,
    fontFamily: fonts.narrow[500],
    fontSize: 15,
    lineHeight: 17,
  },
});
