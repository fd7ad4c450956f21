import { useState } from 'react';
import { View } from 'react-native';
import { Button } from '@/components/ui/button';
import { FactTable } from '@/components/ui/fact-table';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { Analysis } from '@/contract';
import { closedLoopFacts, crossoverFacts, marginFacts } from './loop-facts';
import { type PlantUnits, responseFacts } from './response-facts';

/** Crossovers listed before one asks for the rest: dead time can make hundreds. */
const FIRST_CROSSOVERS = 6;

/** Stability first, then margins, every crossover, and how the closed loop filters. */
export function LoopNumbers({ name, numbers }: { name: string; numbers: Analysis }) {
  const units = useUnits();
  const [all, showAll] = useState(false);
  const crossovers = crossoverFacts(numbers, units);
  const shown = all ? crossovers : crossovers.slice(0, FIRST_CROSSOVERS);
  return (
    <View style={{ gap: 10 }}>
      <Heading level={2}>{`Margins, ${name}`}</Heading>
      {numbers.closedLoop.stable ? null : <Text tone="fail">The loop is unstable: the margins struck out have no meaning.</Text>}
      <FactTable label="Margins" facts={marginFacts(numbers, units)} />
      <Heading level={2}>Closed loop</Heading>
      <FactTable label="Closed loop" facts={closedLoopFacts(numbers, units)} />
      <Heading level={2}>Crossovers</Heading>
      {crossovers.length === 0 ? <Text tone="ink2">|L| is nowhere 1, and L nowhere real and negative.</Text> : null}
      <FactTable label="Crossovers" facts={shown} />
      {shown.length < crossovers.length ? (
        <Button kind="quiet" label={`All ${crossovers.length} crossovers`} onPress={() => showAll(true)} />
      ) : null}
    </View>
  );
}

/** What the time responses come to. */
export function ResponseNumbers({ numbers, plantUnits }: { numbers: Analysis; plantUnits: PlantUnits }) {
  const facts = responseFacts(numbers, plantUnits);
  return (
    <View style={{ gap: 10 }}>
      <Heading level={2}>Responses to a step of 1</Heading>
      {facts.length > 0 ? (
        <FactTable label="Responses" facts={facts} />
      ) : (
        <Text tone="ink2">
          {numbers.closedLoop.stable ? 'This loop has no time responses.' : 'An unstable loop does not settle: there are none.'}
        </Text>
      )}
    </View>
  );
}
