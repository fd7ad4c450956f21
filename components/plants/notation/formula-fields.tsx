import { type Control, useController } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { FormField } from '@/components/ui/form-field';
import { Note } from '@/components/ui/note';
import type { PlantForm } from '../plant-form';
import { formulaNames } from './formula-names';
import { FormulaPlace } from './formula-place';
import type { NotationText } from './notation';
import type { FormulaReading } from './use-formula-reading';

interface FormulaFieldsProps {
  control: Control<PlantForm>;
  typed: NotationText;
  reading: FormulaReading;
}

const HINT = 'Dead time is exp, as in 2 exp(-0.1 s)/(s (s + 3)). Other letters are parameters.';

/** The formula, and a value for every other letter that stands in it. */
export function FormulaFields({ control, typed, reading }: FormulaFieldsProps) {
  const { field, fieldState } = useController({ control, name: 'formula' });
  const names = formulaNames(typed.formula);
  return (
    <>
      <Field
        label="Formula in s"
        value={field.value}
        onChangeText={field.onChange}
        onBlur={field.onBlur}
        error={fieldState.error?.message ?? reading.problem ?? undefined}
        hint={HINT}
        autoCorrect={false}
        spellCheck={false}
        numeric
        compact
      />
      {reading.problem ? <FormulaPlace text={typed.formula.trim()} problem={reading.problem} /> : null}
      {reading.needsSignal ? <Note lead="No signal.">A formula is read by the server. What is typed stays on this device.</Note> : null}
      {names.length > 0 ? (
        <View style={styles.parameters}>
          {names.map((name) => (
            <View key={name} style={styles.parameter}>
              <FormField
                control={control}
                name={`parameters.${name}`}
                label={name}
                hint={typed.parameters[name] ? undefined : 'Needs a value.'}
                inputMode="decimal"
                numeric
                compact
              />
            </View>
          ))}
        </View>
      ) : null}
    </>
  );
}

const styles = StyleSheet.create({
  parameters: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  parameter: { flexGrow: 1, flexBasis: 140 },
});
