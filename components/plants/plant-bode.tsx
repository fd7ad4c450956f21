import { useMemo } from 'react';
import { View } from 'react-native';
import { analyseLoop, buildLoop, loopAt } from '@/analysis';
import { type ChartDesign, CursorProvider, FrequencySheet, type FrequencyPanel } from '@/components/charts';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { Loop, PlantContent } from '@/contract';

const panels: readonly FrequencyPanel[] = ['magnitude', 'phase'];

/** The loop that is the plant alone: a gain of 1 round it, nothing else. */
function plantAlone(plant: PlantContent['plant']): Loop {
  return {
    plant,
    controller: {
      form: 'parallel',
      kp: 1,
      ki: 0,
      kd: 0,
      derivativeFilterTime: 0,
      setpointWeights: { proportional: 1, derivative: 0 },
      feedforward: { gain: 0 },
      filters: [],
    },
    sensor: null,
    sampling: null,
    actuator: null,
    responses: { duration: null, referenceStep: 1, loadStep: 1 },
    at: [],
  };
}

function designOf(plant: PlantContent['plant']): ChartDesign {
  const loop = plantAlone(plant);
  const model = buildLoop(loop);
  return { label: 'P', analysis: analyseLoop(loop), at: loopAt(model) };
}

/** What the plant does by itself, over frequency. */
export function PlantBode({ plant }: { plant: PlantContent['plant'] }) {
  const units = useUnits();
  const design = useMemo(() => designOf(plant), [plant]);
  return (
    <View style={{ gap: 6 }}>
      <Heading level={2}>What it does</Heading>
      <Text step="note" tone="ink2">
        The plant alone, under a gain of 1: L is P here.
      </Text>
      <CursorProvider>
        <FrequencySheet a={design} units={units} panels={panels} height={420} />
      </CursorProvider>
    </View>
  );
}
