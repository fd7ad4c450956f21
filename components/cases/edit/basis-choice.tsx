import { View } from 'react-native';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import type { CaseBasis } from '@/contract';
import { bases, basisWords } from '../basis-words';

const options = bases.map((value) => ({ value, label: basisWords[value].tag }));

/** How well the plant is known there. */
export function BasisChoice({ label, value, onChange }: { label: string; value: CaseBasis; onChange: (basis: CaseBasis) => void }) {
  return (
    <View style={{ gap: 6 }}>
      <Text weight={600}>{label}</Text>
      <Segments label={label} value={value} options={options} onChange={onChange} stretch />
      <Text step="small" tone="ink2">
        {basisWords[value].sentence}
      </Text>
    </View>
  );
}
