import { StyleSheet, TextInput, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { corner, fonts, line, touch } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';

export interface DemandFieldProps {
  id: string;
  label: string;
  text: string;
  unit: string;
  /** What stands for nothing: the default target. */
  placeholder?: string;
  /** Nothing stands for nothing: an empty field is drawn as left out. */
  optional?: boolean;
  wrong: boolean;
  errorId: string;
  autoFocus?: boolean;
  onChange: (text: string) => void;
  onSubmit: () => void;
}

/** A number of a demand with its unit inside; what is wrong with it stands under its row. */
export function DemandField({
  id,
  label,
  text,
  unit,
  placeholder,
  optional,
  wrong,
  errorId,
  autoFocus,
  onChange,
  onSubmit,
}: DemandFieldProps) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const leftOut = optional && text === '' && !placeholder;
  const edge = { borderColor: wrong ? colors.fail : colors.rule2, backgroundColor: colors.paper };
  return (
    <View style={[styles.box, phone && styles.narrow, edge, wrong && styles.wrong, leftOut && styles.dashed]}>
      <TextInput
        id={id}
        aria-label={unit ? `${label}, in ${unit === '°' ? 'degrees' : unit}` : label}
        aria-invalid={wrong || undefined}
        aria-describedby={wrong ? errorId : undefined}
        value={text}
        placeholder={placeholder}
        placeholderTextColor={colors.ink3}
        inputMode="decimal"
        autoComplete="off"
        autoFocus={autoFocus}
        blurOnSubmit={false}
        onChangeText={onChange}
        onSubmitEditing={onSubmit}
        style={[styles.input, unit ? styles.besideUnit : null, { color: colors.ink }]}
      />
      {unit ? (
        <Text step="small" tone="ink3" style={styles.unit} selectable={false}>
          {unit}
        </Text>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    width: 108,
    height: touch,
    flexShrink: 1,
    borderWidth: line.field,
    borderRadius: corner,
    flexDirection: 'row',
    alignItems: 'center',
  },
  narrow: { width: 84 },
  wrong: { borderWidth: 2 },
  dashed: { borderStyle: 'dashed' },
  input: { flex: 1, minWidth: 0, height: '100%', paddingHorizontal: 10, borderRadius: 3, fontFamily: fonts.narrow[600], fontSize: 18 },
  besideUnit: { paddingRight: 34 },
  unit: { position: 'absolute', right: 9, pointerEvents: 'none' },
});
