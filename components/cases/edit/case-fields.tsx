import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { Heading, Text } from '@/components/ui/text';
import type { PlantRevision } from '@/contract';
import { axisName, axisUnit, caseAxes } from '@/figures/axis-text';
import { BasisChoice } from './basis-choice';
import type { CaseForm } from './case-form';
import { parameterWords } from './parameter-words';
import { PlantChoice } from './plant-choice';
import { type CaseErrors, namesFor } from './read-case-form';

interface CaseFieldsProps {
  form: CaseForm;
  plants: readonly PlantRevision[];
  plant: PlantRevision | undefined;
  errors: CaseErrors;
  onType: (change: Partial<CaseForm>) => void;
}

/** What makes a case: its name and place, the plant there, and how well that is known. */
export function CaseFields({ form, plants, plant, errors, onType }: CaseFieldsProps) {
  return (
    <View style={styles.fields}>
      <Field
        label="Name"
        compact
        value={form.name}
        autoCapitalize="sentences"
        error={errors.name}
        hint="As in 30 km/h, driver and low fuel."
        onChangeText={(name) => onType({ name })}
      />
      <Heading level={3}>Where it stands</Heading>
      <View style={styles.row}>
        {caseAxes.map((axis) => (
          <View key={axis} style={styles.third}>
            <Field
              label={axisName(axis)}
              unit={axisUnit(axis, form.speedUnit)}
              numeric
              compact
              inputMode="decimal"
              value={form[axis]}
              error={errors[axis]}
              onChangeText={(text) => onType({ [axis]: text })}
            />
          </View>
        ))}
      </View>
      <Text step="small" tone="ink2">
        Left empty where it does not matter. Cases with a place make the grid.
      </Text>
      <PlantChoice plants={plants} plantId={form.plantId} revision={form.plantRevision} error={errors.plantRevision} onChange={onType} />
      <Heading level={3}>What is different there</Heading>
      <View style={styles.row}>
        {namesFor(plant).map((name) => {
          const { label, unit, hint } = parameterWords(name);
          return (
            <View key={name} style={styles.third}>
              <Field
                label={label}
                unit={unit}
                hint={hint}
                numeric
                compact
                inputMode="decimal"
                value={form.parameters[name] ?? ''}
                error={errors[`parameters.${name}`]}
                onChangeText={(text) => onType({ parameters: { ...form.parameters, [name]: text } })}
              />
            </View>
          );
        })}
      </View>
      <BasisChoice label="How well the plant is known there" value={form.basis} onChange={(basis) => onType({ basis })} />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: 12 },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  third: { flexGrow: 1, flexBasis: 104, minWidth: 0 },
});
