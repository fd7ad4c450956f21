import { useId } from 'react';
import { StyleSheet, TextInput, type TextInputProps } from 'react-native';
import { errorId, FieldFrame, type FieldFrameProps, hintId } from './field-frame';
import { useTheme } from './theme';
import { fonts } from './tokens';

export interface FieldProps extends Omit<FieldFrameProps, 'id' | 'children'>, Omit<TextInputProps, 'id' | 'style'> {
  /** Numbers are set in the narrow face, so that their columns align. */
  numeric?: boolean;
}

export function Field({ label, unit, hint, error, compact, numeric, ...input }: FieldProps) {
  const id = useId();
  const { colors } = useTheme();
  const describedBy = error ? errorId(id) : hint ? hintId(id) : undefined;
  return (
    <FieldFrame id={id} label={label} unit={unit} hint={hint} error={error} compact={compact}>
      <TextInput
        blurOnSubmit={false}
        {...input}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy}
        autoCapitalize={input.autoCapitalize ?? 'none'}
        style={[styles.input, numeric ? styles.number : styles.text, unit ? styles.besideUnit : null, { color: colors.ink }]}
      />
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  input: { flex: 1, minWidth: 0, height: '100%', paddingHorizontal: 12, borderRadius: 3 },
  besideUnit: { paddingRight: 52 },
  text: { fontFamily: fonts.text[400], fontSize: 16 },
  number: { fontFamily: fonts.narrow[600], fontSize: 19 },
});
