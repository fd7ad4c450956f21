import type { Control } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { FormField } from '@/components/ui/form-field';
import { Note } from '@/components/ui/note';
import { Segments } from '@/components/ui/segments';
import type { PlantForm } from '../plant-form';
import { FormulaFields } from './formula-fields';
import { notations, notationWords } from './notation';
import type { FormulaReading } from './use-formula-reading';
import type { NotationChoice } from './use-notation';

export interface NotationFieldsProps {
  control: Control<PlantForm>;
  form: PlantForm;
  choice: NotationChoice;
  reading: FormulaReading;
}

const DeadTimeField = ({ control }: Pick<NotationFieldsProps, 'control'>) => (
  <FormField control={control} name="deadTime" label="Dead time" unit="s" inputMode="decimal" numeric compact />
);

function PolynomialFields({ control }: Pick<NotationFieldsProps, 'control'>) {
  return (
    <>
      <FormField control={control} name="numerator" label="Numerator, highest power first" inputMode="text" numeric compact />
      <FormField control={control} name="denominator" label="Denominator, highest power first" inputMode="text" numeric compact />
      <DeadTimeField control={control} />
    </>
  );
}

function RootFields({ control }: Pick<NotationFieldsProps, 'control'>) {
  return (
    <>
      <FormField
        control={control}
        name="gain"
        label="Gain"
        hint="Of the highest powers: it multiplies (s − zero)… over (s − pole)…"
        inputMode="decimal"
        numeric
        compact
      />
      <FormField control={control} name="zeros" label="Zeros" hint="Empty where there are none." inputMode="text" numeric compact />
      <FormField control={control} name="poles" label="Poles" hint="As in 0, −2, −0.5 ± 3i." inputMode="text" numeric compact />
      <DeadTimeField control={control} />
    </>
  );
}

/** What was typed here before something else was written over it, and how to have it again. */
function LaidAside({ form, choice }: Pick<NotationFieldsProps, 'form' | 'choice'>) {
  const before = form.replaced[form.notation];
  if (!before) return null;
  const { deadTime: _deadTime, parameters: _parameters, ...typed } = before;
  return (
    <View style={styles.aside}>
      <Note lead="Typed here before:">{Object.values(typed).filter(Boolean).join(' · ')}</Note>
      <Button kind="quiet" label="Bring it back" onPress={choice.bringBack} />
    </View>
  );
}

/** One plant in one of three notations. */
export function NotationFields({ control, form, choice, reading }: NotationFieldsProps) {
  const { notation } = form;
  return (
    <View style={styles.fields}>
      <Segments label="How the plant is written" value={notation} options={notations} onChange={choice.choose} stretch />
      <View aria-live="polite" style={choice.reason ? null : styles.silent}>
        {choice.reason ? <Note lead={`Not written as ${notationWords[notation]}.`}>{choice.reason}</Note> : null}
      </View>
      {notation === 'coefficients' ? <PolynomialFields control={control} /> : null}
      {notation === 'roots' ? <RootFields control={control} /> : null}
      {notation === 'formula' ? <FormulaFields control={control} typed={form} reading={reading} /> : null}
      <LaidAside form={form} choice={choice} />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: 14 },
  // A live region stands before it speaks; empty, it takes no gap.
  silent: { position: 'absolute' },
  aside: { gap: 4, alignItems: 'flex-start' },
});
