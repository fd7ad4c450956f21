import { View } from 'react-native';
import { runnablePlant } from '@/analysis/project';
import { Heading, Text } from '@/components/ui/text';
import type { KeptPlant } from '@/contract';
import { coefficientText, polynomialText } from '../equation/polynomial-text';
import { readBack, type ReadablePlant } from '../equation/read-back';
import { formulaText } from './formula-text';
import { notations, type Notation } from './notation';
import { rootsText } from './root-text';

function said(plant: ReadablePlant): Readonly<Record<Notation, string>> | null {
  const read = readBack(plant);
  const runs = runnablePlant(plant as KeptPlant);
  if (!read || runs.kind === 'formula') return null;
  const { numerator, denominator, poles, zeros, gain, deadTime } = read;
  const delay = deadTime > 0 ? `, dead time ${coefficientText(deadTime)} s` : '';
  const listed = (roots: typeof poles) => (roots.length === 0 ? 'none' : `${rootsText(roots)} 1/s`);
  return {
    coefficients: `${polynomialText(numerator)} over ${polynomialText(denominator)}${delay}`,
    roots: `${listed(poles)}. Zeros ${listed(zeros)}. Gain ${coefficientText(gain)}${delay}`,
    formula: formulaText(runs),
  };
}

const leads: Readonly<Record<Notation, string>> = { coefficients: 'Polynomials', roots: 'Poles', formula: 'Formula' };

/** The same plant in the notations in which it was not written. */
export function OtherNotations({ plant }: { plant: ReadablePlant }) {
  const texts = said(plant);
  if (!texts) return null;
  return (
    <View style={{ gap: 4 }}>
      <Heading level={2} step="h3">
        The same in the other notations
      </Heading>
      {notations
        .filter(({ value }) => value !== plant.plant.kind)
        .map(({ value }) => (
          <Text key={value} step="note" tone="ink2">
            <Text step="note" weight={600}>{`${leads[value]} `}</Text>
            {texts[value]}
          </Text>
        ))}
    </View>
  );
}
