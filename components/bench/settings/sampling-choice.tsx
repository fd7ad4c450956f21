import { View } from 'react-native';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import { useBench, useSettings } from '../bench-context';

const options = [
  { value: 'unsaid', label: 'Nobody said' },
  { value: 'continuous', label: 'Continuous, stated' },
] as const;

/** What is stated about sampling; a design that has a sample period keeps it. */
export function SamplingChoice() {
  const { store, subject } = useBench();
  const { statedContinuous } = useSettings();
  const sampling = subject.opened?.sampling;
  const period = sampling !== null && typeof sampling === 'object' ? sampling.period : null;
  if (period !== null) return <Text step="note" tone="ink2">{`Sampled, ${period} s.`}</Text>;
  return (
    <View style={{ gap: 6 }}>
      <Text weight={600}>How the unit samples</Text>
      <Segments
        label="How the unit samples"
        value={statedContinuous ? 'continuous' : 'unsaid'}
        options={options}
        onChange={(value) => store.getState().move({ statedContinuous: value === 'continuous' })}
      />
      <Text step="small" tone="ink2">
        Without a statement nothing is judged: what nobody said cannot be signed.
      </Text>
    </View>
  );
}
