import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { Segments } from '@/components/ui/segments';
import { Heading } from '@/components/ui/text';
import type { Axis } from '@/contract';
import { axisName, axisUnit } from '@/figures/axis-text';
import type { SpeedUnit } from '@/figures/units';
import { BasisChoice } from '../edit/basis-choice';
import { parameterWords } from '../edit/parameter-words';
import { AxisRows } from './axis-rows';
import { type AxisForm, switchWay } from './grid-form';
import type { GridErrors } from './read-grid-form';
import { splitList } from './split-list';

export interface AxisSectionProps {
  axis: Axis;
  form: AxisForm;
  names: readonly string[];
  speedUnit: SpeedUnit;
  errors: GridErrors;
  onChange: (form: AxisForm) => void;
}

const ways = [
  { value: 'lists', label: 'as lists' },
  { value: 'rows', label: 'row by row' },
] as const;

const examples: Readonly<Record<Axis, string>> = { speed: '30, 40, 80, 120', mass: '1380, 1500, 1640', grade: '-5, 0, 5' };
const plurals: Readonly<Record<Axis, string>> = { speed: 'Speeds', mass: 'Masses', grade: 'Grades' };

/** "4: 30, 40, 80, 120 km/h": the list as it is read, so that a comma taken otherwise is seen. */
const readBack = (text: string, unit: string): string | null => {
  const pieces = splitList(text);
  return pieces.length === 0 ? null : `${pieces.length}: ${pieces.join(' · ')} ${unit}`;
};

/** The points along one axis, and what the plant is at each of them. */
export function AxisSection({ axis, form, names, speedUnit, errors, onChange }: AxisSectionProps) {
  const unit = axisUnit(axis, speedUnit);
  return (
    <View role="group" aria-label={plurals[axis]} style={styles.section}>
      <View style={styles.head}>
        <Heading level={3}>{plurals[axis]}</Heading>
        <Segments label={`${plurals[axis]} typed`} value={form.way} options={ways} onChange={(way) => onChange(switchWay(form, way))} />
      </View>
      {form.way === 'rows' ? (
        <AxisRows axis={axis} form={form} names={names} unit={unit} errors={errors} onChange={onChange} />
      ) : (
        <>
          <Field
            label={`${plurals[axis]} to check`}
            unit={unit}
            compact
            numeric
            value={form.at}
            error={errors[`${axis}.at`]}
            hint={readBack(form.at, unit) ?? `As in ${examples[axis]}. Left empty where ${axisName(axis).toLowerCase()} does not matter.`}
            onChangeText={(at) => onChange({ ...form, at })}
          />
          {form.at.trim() === '' ? null : (
            <>
              <View style={styles.parameters}>
                {names.map((name) => (
                  <View key={name} style={styles.parameter}>
                    <Field
                      label={`${parameterWords(name).label} at each ${axisName(axis).toLowerCase()}`}
                      unit={parameterWords(name).unit}
                      compact
                      numeric
                      value={form.parameters[name] ?? ''}
                      error={errors[`${axis}.${name}`]}
                      hint="One for each, one for all, or – for the plant’s own."
                      onChangeText={(text) => onChange({ ...form, parameters: { ...form.parameters, [name]: text } })}
                    />
                  </View>
                ))}
              </View>
              <BasisChoice
                label={`How well the plant is known along ${axisName(axis).toLowerCase()}`}
                value={form.basis}
                onChange={(basis) => onChange({ ...form, basis })}
              />
            </>
          )}
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 10 },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: 10 },
  parameters: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  parameter: { flexGrow: 1, flexBasis: 200, minWidth: 0 },
});
