import { StyleSheet, View } from 'react-native';
import { NumberField } from '@/components/ui/number-field';
import { useBench, useSettings } from '../bench-context';

const within = (most: number) => (value: number) => (Math.abs(value) <= most ? null : `Between ${-most} and ${most}.`);

/** How the controller answers the reference: set-point weights and static feedforward. No margin depends on them. */
export function WeightFields() {
  const { store, subject } = useBench();
  const settings = useSettings();
  const { input, output } = subject.plant.units;
  const { hold, release } = store.getState();
  return (
    <View style={styles.row}>
      <View style={styles.cell}>
        <NumberField
          label="Weight b, proportional"
          value={settings.proportionalWeight}
          refuse={within(10)}
          onChangeNumber={(proportionalWeight) => hold({ proportionalWeight })}
          onBlur={release}
        />
      </View>
      <View style={styles.cell}>
        <NumberField
          label="Weight c, derivative"
          value={settings.derivativeWeight}
          refuse={within(10)}
          onChangeNumber={(derivativeWeight) => hold({ derivativeWeight })}
          onBlur={release}
        />
      </View>
      <View style={styles.cell}>
        <NumberField
          label="Feedforward"
          unit={input && output ? `${input} per ${output}` : 'command per reference'}
          value={settings.feedforward}
          refuse={within(1e12)}
          onChangeNumber={(feedforward) => hold({ feedforward })}
          onBlur={release}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  cell: { flexGrow: 1, flexBasis: 180 },
});
