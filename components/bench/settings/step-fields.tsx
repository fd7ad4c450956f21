import { StyleSheet, View } from 'react-native';
import { NumberField } from '@/components/ui/number-field';
import { useBench } from '../bench-context';
import type { BenchLink, ChangeLink } from '../subject/bench-link';

interface StepFieldsProps {
  link: BenchLink;
  onLink: ChangeLink;
}

const refuse = (value: number) => (Math.abs(value) <= 1e12 ? null : 'Of magnitude at most 1e12.');
const written = (size: number): string | undefined => (size === 1 ? undefined : String(size));

/** How large the steps are whose responses are drawn. They stand in the address, since they are how one looks and not what is kept. */
export function StepFields({ link, onLink }: StepFieldsProps) {
  const { units } = useBench().subject.plant;
  return (
    <View style={styles.row}>
      <View style={styles.cell}>
        <NumberField
          label="Reference step"
          unit={units.output}
          value={link.steps.reference}
          refuse={refuse}
          onChangeNumber={(size) => onLink({ step: written(size) })}
        />
      </View>
      <View style={styles.cell}>
        <NumberField
          label="Load step, at the command"
          unit={units.input}
          value={link.steps.load}
          refuse={refuse}
          onChangeNumber={(size) => onLink({ load: written(size) })}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  cell: { flexGrow: 1, flexBasis: 180 },
});
