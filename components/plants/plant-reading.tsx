import { View } from 'react-native';
import { type Fact, FactTable } from '@/components/ui/fact-table';
import { Text } from '@/components/ui/text';
import type { FrozenCase, PlantRevision } from '@/contract';
import { PlantEquation } from './equation/plant-equation';
import { readBack } from './equation/read-back';
import { coefficientText } from './equation/polynomial-text';

const basisWords = { measured: 'measured', assumed: 'assumed' };

/** A plant of the project, or as an analysis froze it. */
type NamedPlant = PlantRevision | FrozenCase['plant'];

/** The formula as it was typed, which the equation does not show. */
function Typed({ plant }: Pick<NamedPlant, 'plant'>) {
  if (plant.kind !== 'formula') return null;
  const values = Object.entries(plant.parameters).map(([name, value]) => `${name} = ${coefficientText(value)}`);
  return (
    <Text step="note" tone="ink2">
      <Text step="note" weight={600}>
        {'Written as '}
      </Text>
      {[plant.text, ...values].join(', ')}
    </Text>
  );
}

function facts(named: NamedPlant): Fact[] {
  const { deadTimeBasis, sensor, units } = named;
  const read = readBack(named);
  return [
    {
      name: 'Dead time',
      value: read ? `${coefficientText(read.deadTime)} s` : 'as in the formula',
      aside: deadTimeBasis ? basisWords[deadTimeBasis] : 'nobody said where from',
    },
    { name: 'Sensor lag', value: `${coefficientText(sensor?.timeConstant ?? 0)} s` },
    { name: 'Sensor dead time', value: `${coefficientText(sensor?.deadTime ?? 0)} s` },
    { name: 'Command', value: units.input || 'no unit' },
    { name: 'Output', value: units.output || 'no unit' },
  ];
}

/** A plant to be read, not changed. */
export function PlantReading({ plant }: { plant: NamedPlant }) {
  return (
    <View style={{ gap: 12 }}>
      <PlantEquation plant={plant} />
      <Typed plant={plant.plant} />
      <FactTable label={`${plant.name}, rev ${plant.revision}`} facts={facts(plant)} />
    </View>
  );
}
