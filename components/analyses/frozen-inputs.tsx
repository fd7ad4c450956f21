import { View } from 'react-native';
import { PlantReading } from '@/components/plants/plant-reading';
import { FactTable } from '@/components/ui/fact-table';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { FrozenInputs as Inputs, KeptAnalysis } from '@/contract';
import { formatGain } from '@/figures/format';
import { controllerFacts, filterFacts } from './controller-facts';

const NO_UNITS = { input: '', output: '' };

function sampled({ sampling }: Inputs['design']): string {
  if (sampling === null) return 'Nobody stated the sample time; computed as continuous.';
  if (sampling === 'continuous') return 'Stated to be continuous.';
  return `Sampled at ${formatGain(sampling.period)} s.`;
}

/** Everything the numbers came from, as it was then. */
export function FrozenInputs({ analysis }: { analysis: KeptAnalysis }) {
  const { design, cases, limits } = analysis.inputs;
  const { frequency } = useUnits();
  return (
    <View style={{ gap: 10 }}>
      <Heading level={2}>Computed from</Heading>
      <Text weight={600}>{`${design.name}, rev ${design.revision}, ${design.controller.form} form`}</Text>
      <FactTable label="Gains" facts={controllerFacts(design.controller, cases[0]?.plant.units ?? NO_UNITS)} />
      {design.controller.filters.length > 0 && <FactTable label="Filters" facts={filterFacts(design.controller.filters, frequency)} />}
      <Text step="note" tone="ink2">
        {`${sampled(design)}${limits.length === 0 ? ' No limits were set.' : ''}`}
      </Text>
      {cases.map((frozen) => (
        <View key={frozen.id} style={{ gap: 6 }}>
          <Text weight={600}>{`${frozen.name}: ${frozen.plant.name}, rev ${frozen.plant.revision}`}</Text>
          <PlantReading plant={frozen.plant} />
        </View>
      ))}
    </View>
  );
}
