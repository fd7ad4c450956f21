import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { gainUnit, type PlantUnits, withUnit } from '@/figures';
import { useBench, useSettings } from '../bench-context';
import { formNames, forms, type Written, writtenIn } from '../draft/form';
import { gains, gainWords } from '../draft/gain';
import type { Form } from '../draft/settings';
import { gainText } from '../gains/gain-text';

/** The same controller in the forms that are not on the bench: for a control unit that wants it so. They follow every move. */
export function OtherForms() {
  const settings = useSettings();
  const { units } = useBench().subject.plant;
  return (
    <View style={styles.row}>
      {forms
        .filter((form) => form !== settings.form)
        .map((form) => (
          <OneForm key={form} form={form} written={writtenIn(form, settings)} units={units} />
        ))}
    </View>
  );
}

interface OneFormProps {
  form: Form;
  written: Written;
  units: PlantUnits;
}

function OneForm({ form, written, units }: OneFormProps) {
  const { colors } = useTheme();
  return (
    <View role="group" aria-label={`The same in ${form} form`} style={[styles.form, { borderLeftColor: colors.rule2 }]}>
      <Text step="note" weight={600}>{`The same in ${form} form`}</Text>
      {'refusal' in written ? (
        <Text step="note" tone="ink2">{`${formNames[form]} form cannot say it. ${written.refusal}`}</Text>
      ) : (
        gains.map((gain) => {
          const { label } = gainWords(gain, form);
          const value = written.gains[gain];
          return (
            <View key={gain} style={styles.gain}>
              <Text step="note" tone="ink2" style={styles.label}>
                {label}
              </Text>
              <Text step="note" weight={600}>
                {value === null ? gainText(value) : withUnit(gainText(value), gainUnit(label, units))}
              </Text>
            </View>
          );
        })
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  form: { flexGrow: 1, flexBasis: 160, borderLeftWidth: line.field, paddingLeft: 12, gap: 2 },
  gain: { flexDirection: 'row', gap: 8 },
  label: { width: 24 },
});
