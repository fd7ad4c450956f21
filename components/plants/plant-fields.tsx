import type { ReactNode } from 'react';
import { type Control, useController } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { FormField } from '@/components/ui/form-field';
import { Segments } from '@/components/ui/segments';
import { Heading, Text } from '@/components/ui/text';
import { NotationFields, type NotationFieldsProps } from './notation/notation-fields';
import type { PlantForm } from './plant-form';

const bases = [
  { value: 'measured', label: 'measured' },
  { value: 'assumed', label: 'assumed' },
  { value: 'unsaid', label: 'nobody said' },
] as const;

function BasisField({ control }: { control: Control<PlantForm> }) {
  const { field } = useController({ control, name: 'basis' });
  return (
    <View style={styles.tight}>
      <Text weight={600}>Where the dead time comes from</Text>
      <Segments label="Where the dead time comes from" value={field.value} options={bases} onChange={field.onChange} stretch />
      {field.value === 'unsaid' ? (
        <Text step="small" tone="ink2">
          Margins are not judged while nobody says.
        </Text>
      ) : null}
    </View>
  );
}

interface PlantFieldsProps extends NotationFieldsProps {
  /** Stands below what is typed, where there is no other column for it. */
  readBack: ReactNode;
}

/** What makes a plant: its name, what is typed of it, its delays and units. */
export function PlantFields({ readBack, ...typed }: PlantFieldsProps) {
  const { control } = typed;
  return (
    <View style={styles.fields}>
      <FormField control={control} name="name" label="Name" autoCapitalize="sentences" compact />
      <NotationFields {...typed} />
      {readBack}
      <BasisField control={control} />
      <Heading level={2}>Sensor</Heading>
      <View style={styles.pair}>
        <View style={styles.half}>
          <FormField control={control} name="sensorLag" label="Lag" unit="s" inputMode="decimal" numeric compact />
        </View>
        <View style={styles.half}>
          <FormField control={control} name="sensorDeadTime" label="Sensor’s dead time" unit="s" inputMode="decimal" numeric compact />
        </View>
      </View>
      <Heading level={2}>Units</Heading>
      <View style={styles.pair}>
        <View style={styles.half}>
          <FormField control={control} name="inputUnit" label="Command" hint="As in kN·m." compact />
        </View>
        <View style={styles.half}>
          <FormField control={control} name="outputUnit" label="Output" hint="As in m/s." compact />
        </View>
      </View>
      <FormField control={control} name="note" label="Note to this revision" hint="May be left empty." autoCapitalize="sentences" compact />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: 14 },
  tight: { gap: 6 },
  pair: { flexDirection: 'row', gap: 12 },
  half: { flex: 1, minWidth: 0 },
});
