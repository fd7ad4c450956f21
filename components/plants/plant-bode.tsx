import { useMemo } from 'react';
import { View } from 'react-native';
import { LoopError, plantResponse, type PlantResponse } from '@/analysis';
import { runnablePlant } from '@/analysis/project';
import { CursorProvider, PlantReadOut, PlantSheet } from '@/components/charts';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { frequencyFrom } from '@/figures';
import type { ReadablePlant } from './equation/read-back';

function responseOrReason(plant: ReadablePlant): { response: PlantResponse } | { reason: string } {
  try {
    return { response: plantResponse(runnablePlant(plant)) };
  } catch (error) {
    if (error instanceof LoopError) return { reason: error.detail };
    throw error;
  }
}

/** What the plant does by itself, over frequency. */
export function PlantBode({ plant }: { plant: ReadablePlant }) {
  const units = useUnits();
  const drawn = useMemo(() => responseOrReason(plant), [plant]);
  return (
    <View style={{ gap: 8 }}>
      <Heading level={2}>What it does</Heading>
      {'reason' in drawn ? (
        <Text tone="ink2">{`It cannot be drawn. ${drawn.reason}`}</Text>
      ) : (
        <CursorProvider>
          <PlantSheet {...drawn.response} units={units} height={440} />
          <PlantReadOut scene={{ ...drawn.response, units }} rest={frequencyFrom(units.frequency, 1)} />
        </CursorProvider>
      )}
    </View>
  );
}
