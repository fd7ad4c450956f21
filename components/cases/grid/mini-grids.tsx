import { StyleSheet, View } from 'react-native';
import type { Quantity } from '@/contract';
import type { CaseData } from '../use-case-data';
import type { useShownCases } from '../use-shown-cases';
import { MiniGrid } from './mini-grid';

const MOST = 4;
/** More columns than this cannot be read so small. */
const MOST_COLUMNS = 12;

interface MiniGridsProps {
  data: CaseData;
  shown: ReturnType<typeof useShownCases>;
  onChoose: (quantity: Quantity) => void;
}

/** The other numbers over the same cases, small, beside the one that is chosen. */
export function MiniGrids({ data: { views, analysis }, shown: { layout, quantities, quantity }, onChoose }: MiniGridsProps) {
  if (layout === null || layout.columns.length < 2 || layout.columns.length > MOST_COLUMNS) return null;
  const others = quantities.first.filter((other) => other !== quantity).slice(0, MOST);
  return (
    <View role="group" aria-label="Other numbers over the same cases" style={styles.grids}>
      {others.map((other) => (
        <MiniGrid key={other} layout={layout} views={views} quantity={other} limits={analysis?.inputs.limits ?? []} onChoose={onChoose} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ grids: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 20, rowGap: 14, paddingTop: 4 } });
