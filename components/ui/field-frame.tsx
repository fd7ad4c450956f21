import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';
import { corner, line } from './tokens';

export interface FieldFrameProps {
  id: string;
  label: string;
  unit?: string;
  hint?: string;
  error?: string;
  compact?: boolean;
}

export const errorId = (id: string) => `${id}-error`;
export const hintId = (id: string) => `${id}-hint`;

/** What every field has round it: its label above, its unit inside at the right, and below either what is wrong or what helps. */
export function FieldFrame({ id, label, unit, hint, error, compact, children }: PropsWithChildren<FieldFrameProps>) {
  const { colors } = useTheme();
  return (
    <View style={styles.field}>
      <label htmlFor={id}>
        <Text weight={600}>{label}</Text>
      </label>
      <View
        style={[
          styles.box,
          compact && styles.compact,
          { backgroundColor: colors.paper, borderColor: error ? colors.fail : colors.rule2 },
          error ? styles.wrong : null,
        ]}
      >
        {children}
        {unit ? (
          <Text step="small" tone="ink3" style={styles.unit} selectable={false}>
            {unit}
          </Text>
        ) : null}
      </View>
      <View aria-live="polite">
        {error ? (
          <View style={[styles.error, { borderLeftColor: colors.fail }]}>
            <Text nativeID={errorId(id)} step="note" tone="fail">
              {error}
            </Text>
          </View>
        ) : hint ? (
          <Text nativeID={hintId(id)} step="small" tone="ink2">
            {hint}
          </Text>
        ) : null}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: 6, alignSelf: 'stretch' },
  box: { height: 52, borderWidth: line.field, borderRadius: corner, flexDirection: 'row', alignItems: 'center' },
  compact: { height: 48 },
  wrong: { borderWidth: 2 },
  // Over the field's own right end, so that the focus ring goes round both.
  unit: { position: 'absolute', right: 12, pointerEvents: 'none' },
  error: { borderLeftWidth: 4, paddingLeft: 8 },
});
