import { StyleSheet, View } from 'react-native';
import { NumberField, type NumberFieldProps } from '@/components/ui/number-field';
import { useUnits } from '@/components/ui/units';
import type { Filter } from '@/contract';
import { frequencyFrom, frequencyIn } from '@/figures';
import { useBench } from '../bench-context';

interface FilterFieldsProps {
  filter: Filter;
  onHold: (filter: Filter) => void;
}

const LONGEST = 1e6;
const FASTEST = 1e9;
const WIDEST = 100;

const time = (value: number) => (value >= 0 && value <= LONGEST ? null : 'A time is from 0 to 1,000,000 s.');
const positiveTime = (value: number) => (value > 0 ? time(value) : 'A pole time is more than 0.');
const depth = (value: number) => (value >= 0 && value <= 1 ? null : 'Depth is from 0 to 1.');
const width = (value: number) => (value > 0 && value <= WIDEST ? null : 'Width is more than 0, at most 100.');

/** In the reader's unit without the tail that the turn from rad/s leaves: 5 Hz stay 5. */
const shown = (value: number): number => Number(value.toPrecision(12));

/** The numbers of one filter. One that means nothing stays as typed with the reason under it, and the filter as it was. */
export function FilterFields({ filter, onHold }: FilterFieldsProps) {
  const unit = useUnits().frequency;
  const cells = ((): Omit<NumberFieldProps, 'onBlur'>[] => {
    if (filter.kind === 'lowPass') {
      const set = (timeConstant: number) => onHold({ ...filter, timeConstant });
      return [{ label: 'Time constant', unit: 's', value: filter.timeConstant, refuse: time, onChangeNumber: set }];
    }
    if (filter.kind === 'leadLag') {
      const setZero = (zeroTime: number) => onHold({ ...filter, zeroTime });
      const setPole = (poleTime: number) => onHold({ ...filter, poleTime });
      return [
        { label: 'Zero, time', unit: 's', value: filter.zeroTime, refuse: time, onChangeNumber: setZero },
        { label: 'Pole, time', unit: 's', value: filter.poleTime, refuse: positiveTime, onChangeNumber: setPole },
      ];
    }
    const place = (value: number) =>
      value > 0 && frequencyFrom(unit, value) <= FASTEST ? null : 'A notch stands above 0, at most at 1e9 rad/s.';
    const setPlace = (value: number) => onHold({ ...filter, frequency: frequencyFrom(unit, value) });
    return [
      { label: 'Frequency', unit, value: shown(frequencyIn(unit, filter.frequency)), refuse: place, onChangeNumber: setPlace },
      { label: 'Depth, gain left', value: filter.depth, refuse: depth, onChangeNumber: (next) => onHold({ ...filter, depth: next }) },
      { label: 'Width, damping', value: filter.width, refuse: width, onChangeNumber: (next) => onHold({ ...filter, width: next }) },
    ];
  })();
  const { store } = useBench();
  return (
    <View style={styles.row}>
      {cells.map((cell) => (
        <View key={cell.label} style={styles.cell}>
          <NumberField {...cell} compact onBlur={() => store.getState().release()} />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  cell: { flexGrow: 1, flexBasis: 140 },
});
