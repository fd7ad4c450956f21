import { useMemo } from 'react';
import { View } from 'react-native';
import { LoopError, plantResponse, type PlantResponse } from '@/analysis';
import { CursorProvider, PlantReadOut, PlantSheet } from '@/components/charts';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { PlantContent } from '@/contract';
import { frequencyFrom } from '@/figures';

function responseOrReason(plant: PlantContent['plant']): { response: PlantResponse } | { reason: string } {
  try {
    return { response: plantResponse(plant) };
  } catch (error) {
    if (error instanceof LoopError) return { reason: error.detail };
    throw error;
  }
}

/** What the plant does by itself, over frequency. */
export function PlantBode({ plant }: { plant: PlantContent['plant'] }) {
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
