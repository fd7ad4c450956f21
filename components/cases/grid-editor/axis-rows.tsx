import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { Menu } from '@/components/ui/menu';
import { useTheme } from '@/components/ui/theme';
import type { Axis } from '@/contract';
import { axisName } from '@/figures/axis-text';
import { bases, basisWords } from '../basis-words';
import { parameterWords } from '../edit/parameter-words';
import { type AxisForm, emptyPoint, type PointForm } from './grid-form';
import type { GridErrors } from './read-grid-form';

interface AxisRowsProps {
  axis: Axis;
  form: AxisForm;
  names: readonly string[];
  unit: string;
  errors: GridErrors;
  onChange: (form: AxisForm) => void;
}

/** The points of an axis one under the other, each with its own parameters, name and basis. */
export function AxisRows({ axis, form, names, unit, errors, onChange }: AxisRowsProps) {
  const setRow = (index: number, change: Partial<PointForm>) =>
    onChange({ ...form, rows: form.rows.map((row, i) => (i === index ? { ...row, ...change } : row)) });
  const last = form.rows[form.rows.length - 1] ?? emptyPoint;
  return (
    <View style={styles.rows}>
      {form.rows.map((row, index) => (
        <PointRow
          key={index}
          number={index + 1}
          axis={axis}
          row={row}
          names={names}
          unit={unit}
          errorAt={(column) => errors[`${axis}.${index}.${column}`]}
          onChange={(change) => setRow(index, change)}
          onRemove={() => onChange({ ...form, rows: form.rows.filter((_, i) => i !== index) })}
        />
      ))}
      <Button
        label={`Add a ${axisName(axis).toLowerCase()}`}
        icon="plus"
        onPress={() => onChange({ ...form, rows: [...form.rows, { ...emptyPoint, basis: last.basis }] })}
      />
    </View>
  );
}

interface PointRowProps extends Pick<AxisRowsProps, 'axis' | 'names' | 'unit'> {
  number: number;
  row: PointForm;
  errorAt: (column: string) => string | undefined;
  onChange: (change: Partial<PointForm>) => void;
  onRemove: () => void;
}

function PointRow({ number, axis, row, names, unit, errorAt, onChange, onRemove }: PointRowProps) {
  const { colors } = useTheme();
  const numeric = { compact: true, numeric: true, inputMode: 'decimal' as const };
  return (
    <View role="group" aria-label={`${axisName(axis)} ${number}`} style={[styles.row, { borderBottomColor: colors.rule }]}>
      <View style={styles.cell}>
        <Field
          {...numeric}
          label={`${axisName(axis)} ${number}`}
          unit={unit}
          value={row.at}
          error={errorAt('at')}
          onChangeText={(at) => onChange({ at })}
        />
      </View>
      {names.map((name) => (
        <View key={name} style={styles.cell}>
          <Field
            {...numeric}
            label={parameterWords(name).label}
            unit={parameterWords(name).unit}
            value={row.parameters[name] ?? ''}
            error={errorAt(name)}
            onChangeText={(text) => onChange({ parameters: { ...row.parameters, [name]: text } })}
          />
        </View>
      ))}
      <View style={styles.cell}>
        <Field label="Name" compact value={row.name} error={errorAt('name')} onChangeText={(name) => onChange({ name })} />
      </View>
      <View style={styles.tools}>
        <Menu
          label={basisWords[row.basis].tag}
          name="Known"
          kind="quiet"
          items={bases.map((basis) => ({
            key: basis,
            label: basisWords[basis].tag,
            current: basis === row.basis,
            onSelect: () => onChange({ basis }),
          }))}
        />
        <IconButton icon="close" label={`Remove ${axisName(axis).toLowerCase()} ${number}`} onPress={onRemove} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  rows: { gap: 8 },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 10, paddingBottom: 10, borderBottomWidth: 1 },
  cell: { flexGrow: 1, flexBasis: 108, minWidth: 0 },
  tools: { flexDirection: 'row', alignItems: 'flex-end', marginLeft: 'auto' },
});
