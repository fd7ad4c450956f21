import { View } from 'react-native';
import { defaultTarget } from '@/analysis/project';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { withUnit } from '@/figures/format';
import { quantityName } from '@/figures/quantity-text';
import { DemandField } from './demand-field';
import { useLimitsTable } from './limits-context';
import { type DemandRow, keyOf, typed } from './model/demand-row';
import { demandDigits, type DemandUnit, demandUnit } from './model/demand-unit';
import { boundWords } from './model/row-words';
import { SourceField } from './source-field';

/** The element that a row's field is, so that the first wrong one can be given the focus. */
export const fieldId = ({ quantity, bound }: Pick<DemandRow, 'quantity' | 'bound'>, field: 'limit' | 'target') =>
  `demand-${quantity}-${bound}-${field}`;

const labelOf = ({ quantity, bound }: DemandRow) => `${quantityName(quantity)}, ${boundWords[bound]}`;

interface NumberCellProps {
  row: DemandRow;
  field: 'limit' | 'target';
}

/** The target that stands for an empty one; undefined where none does. */
function standIn({ row: { quantity, bound, limit }, field }: NumberCellProps, unit: DemandUnit): string | undefined {
  const target = field === 'target' && limit.value !== null ? defaultTarget({ quantity, bound, limit: limit.value }) : null;
  return target === null ? undefined : demandDigits(target, unit);
}

/** The limit or the target of a demand as others may only read it; a default target is set lighter. */
export function ReadNumber(cell: NumberCellProps) {
  const unit = demandUnit(cell.row.quantity, useUnits());
  const { text } = cell.row[cell.field];
  const shown = text || standIn(cell, unit);
  return <Text tone={text ? 'ink' : 'ink3'}>{shown ? withUnit(shown, unit.name) : 'none'}</Text>;
}

/** The limit or the target of a demand, typed in the reader's unit. */
export function NumberCell(cell: NumberCellProps) {
  const { row, field } = cell;
  const units = useUnits();
  const table = useLimitsTable();
  const unit = demandUnit(row.quantity, units);
  const id = fieldId(row, field);
  return (
    <DemandField
      id={id}
      label={`${labelOf(row)}, ${field}`}
      text={row[field].text}
      unit={unit.name}
      optional={field === 'target'}
      placeholder={standIn(cell, unit)}
      wrong={table.errorsOf(row)[field] !== undefined}
      errorId={`${id}-error`}
      autoFocus={field === 'limit' && table.fresh === keyOf(row)}
      onChange={(text) => table.change({ ...row, [field]: typed(text, row.quantity, units) }, field)}
      onSubmit={table.keep}
    />
  );
}

export function SourceCell({ row }: { row: DemandRow }) {
  const { change } = useLimitsTable();
  return (
    <SourceField
      label={`${labelOf(row)}, where it comes from`}
      text={row.source}
      onChange={(source) => change({ ...row, source }, 'source')}
    />
  );
}

/** What is wrong with a row, under its fields. */
export function RowProblems({ row }: { row: DemandRow }) {
  const { colors } = useTheme();
  const errors = useLimitsTable().errorsOf(row);
  return (
    <View aria-live="polite" style={{ gap: 2 }}>
      {(['limit', 'target'] as const).map((field) =>
        errors[field] === undefined ? null : (
          <View key={field} style={{ borderLeftWidth: 4, borderLeftColor: colors.fail, paddingLeft: 8 }}>
            <Text nativeID={`${fieldId(row, field)}-error`} step="note" tone="fail">
              {errors[field]}
            </Text>
          </View>
        ),
      )}
    </View>
  );
}
