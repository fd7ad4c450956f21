import { View } from 'react-native';
import { PlantReading } from '@/components/plants/plant-reading';
import { type Fact, FactTable } from '@/components/ui/fact-table';
import { Heading, Text } from '@/components/ui/text';
import type { Controller, FrozenInputs as Inputs, KeptAnalysis } from '@/contract';
import { formatGain } from '@/figures/format';

function gains(controller: Controller): Fact[] {
  const tf = { name: 'Tf', value: formatGain(controller.derivativeFilterTime), aside: 's' };
  const { setpointWeights, feedforward } = controller;
  const shared = [
    tf,
    { name: 'Set-point weight b', value: formatGain(setpointWeights.proportional) },
    { name: 'Set-point weight c', value: formatGain(setpointWeights.derivative) },
    { name: 'Feedforward', value: formatGain(feedforward.gain) },
  ];
  const named =
    controller.form === 'parallel'
      ? { Kp: controller.kp, Ki: controller.ki, Kd: controller.kd }
      : { Kp: controller.kp, Ti: controller.ti, Td: controller.td };
  return [...Object.entries(named).map(([name, value]) => ({ name, value: value === null ? 'none' : formatGain(value) })), ...shared];
}

function sampled({ sampling }: Inputs['design']): string {
  if (sampling === null) return 'Nobody stated the sample time; computed as continuous.';
  if (sampling === 'continuous') return 'Stated to be continuous.';
  return `Sampled at ${formatGain(sampling.period)} s.`;
}

/** Everything the numbers came from, as it was then. */
export function FrozenInputs({ analysis }: { analysis: KeptAnalysis }) {
  const { design, cases, limits } = analysis.inputs;
  return (
    <View style={{ gap: 10 }}>
      <Heading level={2}>Computed from</Heading>
      <Text weight={600}>{`${design.name}, rev ${design.revision}, ${design.controller.form} form`}</Text>
      <FactTable label="Gains" facts={gains(design.controller)} />
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
