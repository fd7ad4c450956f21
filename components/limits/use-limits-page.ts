import { useMemo, useState } from 'react';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { useUnits } from '@/components/ui/units';
import { quantityName } from '@/figures/quantity-text';
import type { ReadLimits } from '@/hooks/queries/limits';
import { useSignal } from '@/hooks/use-signal';
import { isOutdated } from './limits-notices';
import type { LimitsTable } from './limits-context';
import { checkRows } from './model/check-rows';
import { demandOf, type DemandRow, keyOf, rowsOf } from './model/demand-row';
import { type Difference, differences, onTopOf, takingTheirs } from './model/meet-theirs';
import { rewriteDemand, writtenOtherwise } from './model/rewrite-demand';
import { rowErrors } from './model/row-errors';
import type { StartingSet } from './model/starting-sets';
import { fieldId } from './row-fields';
import { useKeepLimits } from './use-keep-limits';
import { useLimitsEdit } from './use-limits-edit';
import { useStandings } from './use-standings';

/** Everything that the page of limits shows and does. */
export function useLimitsPage(kept: ReadLimits) {
  const { id } = useProject();
  const mayEdit = useMayEdit();
  const units = useUnits();
  const signal = useSignal();
  const announce = useAnnounce();
  const editing = useLimitsEdit(id, kept);
  const keeping = useKeepLimits();
  const [asked, setAsked] = useState(false);
  const [fresh, setFresh] = useState<string | null>(null);
  const { edit, change, changed, overtaken } = editing;
  const { rows, base } = edit;
  const checked = useMemo(() => checkRows(rows, units), [rows, units]);
  const { analysis, revision, standingOf } = useStandings(rows, checked);
  const errorsOf = rowErrors({ rows, checked, refused: keeping.refused, asked });
  const outdated = isOutdated(analysis, kept);

  const keep = () => {
    if (!changed && outdated) return keeping.judge();
    setAsked(true);
    if (checked.limits) {
      keeping.keep(checked.limits, base);
      return setAsked(false);
    }
    const wrong = rows.findIndex((_, index) => checked.errors[index].limit ?? checked.errors[index].target);
    document.getElementById(fieldId(rows[wrong], checked.errors[wrong].limit ? 'limit' : 'target'))?.focus();
  };
  const replace = (row: DemandRow, next: DemandRow) => rows.map((other) => (keyOf(other) === keyOf(row) ? next : other));
  const table: LimitsTable = {
    mayEdit,
    revision,
    standingOf,
    errorsOf,
    fresh,
    keep: () => mayKeep && keep(),
    change: (row, field) => change(replace(row, row), `${keyOf(row)} ${field}`),
    otherwiseOf: (row) => {
      const into = demandOf(row) && writtenOtherwise(row);
      return into && !rows.some((other) => keyOf(other) === keyOf(into)) ? into.quantity : null;
    },
    rewrite: (row) => change(replace(row, rewriteDemand(row, units))),
    takeOut: (row) => {
      change(rows.filter((other) => keyOf(other) !== keyOf(row)));
      announce(`${quantityName(row.quantity)} taken out. Undo brings it back.`);
    },
  };
  const mayKeep = signal && !overtaken && (changed || (outdated && keeping.design !== null));
  return {
    table,
    rows,
    editing,
    keeping,
    analysis,
    mayKeep,
    keepLabel: keeping.design ? (changed || !outdated ? 'Keep, judge again' : 'Judge again') : 'Keep',
    keep,
    differing: overtaken ? differences(base.items, rows, kept.items) : null,
    takeRow: (difference: Difference) => change(takingTheirs(rows, difference, units)),
    takeTheirs: () => editing.rebase(rowsOf(kept.items, units)),
    putMineOnTop: () => editing.rebase(onTopOf({ base: base.items, rows, theirs: kept.items }, units)),
    add: (row: DemandRow) => {
      setFresh(keyOf(row));
      change([...rows, row]);
    },
    startFrom: (next: DemandRow[], set: StartingSet) => {
      change(next);
      announce(`Started from the set ${set.name}. Nothing is kept yet.`);
    },
  };
}
