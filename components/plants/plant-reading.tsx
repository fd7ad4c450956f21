import { View } from 'react-native';
import { type Fact, FactTable } from '@/components/ui/fact-table';
import type { FrozenCase, PlantRevision } from '@/contract';
import { PlantEquation } from './equation/plant-equation';
import { coefficientText } from './equation/polynomial-text';

const basisWords = { measured: 'measured', assumed: 'assumed' };

/** A plant of the project, or as an analysis froze it. */
type ReadablePlant = PlantRevision | FrozenCase['plant'];

function facts({ plant, deadTimeBasis, sensor, units }: ReadablePlant): Fact[] {
  const deadTime = 'deadTime' in plant ? `${coefficientText(plant.deadTime)} s` : 'as in the formula';
  return [
    { name: 'Dead time', value: deadTime, aside: deadTimeBasis ? basisWords[deadTimeBasis] : 'nobody said where from' },
    { name: 'Sensor lag', value: `${coefficientText(sensor?.timeConstant ?? 0)} s` },
    { name: 'Sensor dead time', value: `${coefficientText(sensor?.deadTime ?? 0)} s` },
    { name: 'Command', value: units.input || 'no unit' },
    { name: 'Output', value: units.output || 'no unit' },
  ];
}

/** A plant to be read, not changed. */
export function PlantReading({ plant }: { plant: ReadablePlant }) {
  return (
    <View style={{ gap: 12 }}>
      <PlantEquation plant={plant.plant} />
      <FactTable label={`${plant.name}, rev ${plant.revision}`} facts={facts(plant)} />
    </View>
  );
}
