import type { Units } from '@/components/ui/units';
import type { Quantity } from '@/contract';
import { axisName, axisUnit } from '@/figures/axis-text';
import type { CaseGridLayout } from '../model/case-grid';
import type { CaseNumber } from '../model/case-number';
import { columnName, cornerName, placeOf, rowName, standsFor } from './grid-place';

export interface GridCell {
  readonly key: string;
  /** The one that stands for the place; null where no case is. */
  readonly shown: CaseNumber | null;
  readonly all: readonly CaseNumber[];
}

interface Head {
  readonly key: string;
  readonly name: string;
}

/** Rows and columns as they are drawn, with their names. */
export interface GridTable {
  readonly corner: string;
  readonly columns: readonly Head[];
  readonly rows: readonly (Head & { readonly cells: readonly GridCell[] })[];
}

interface Reading {
  readonly quantity: Quantity;
  readonly numbers: ReadonlyMap<string, CaseNumber>;
  readonly units: Units;
  /** Turned by a quarter: on a phone speeds run down. */
  readonly turned: boolean;
}

/** The grid that is drawn, from where cases stand and what their numbers are. */
export function gridTable(layout: CaseGridLayout, { quantity, numbers, units, turned }: Reading): GridTable {
  const cells = layout.cells.map((row, r) =>
    row.map((views, c): GridCell => {
      const all = views.flatMap(({ kept }) => numbers.get(kept.id) ?? []);
      return { key: `${layout.rows[r].key} ${layout.columns[c]}`, shown: standsFor(all, quantity), all };
    }),
  );
  const loads = layout.rows.map((row): Head => ({ key: row.key, name: rowName(row, units) }));
  const along = (name: (at: number) => string) => layout.columns.map((at): Head => ({ key: String(at), name: name(at) }));
  if (!turned) {
    const rows = loads.map((head, r) => ({ ...head, cells: cells[r] }));
    return { corner: cornerName(layout, units), columns: along((at) => columnName(layout, at, units)), rows };
  }
  const speeds = along((at) => (layout.rowAxes.length === 0 ? placeOf(layout, at, units) : columnName(layout, at, units)));
  return {
    corner: layout.rowAxes.length === 0 ? axisName(layout.column) : axisUnit(layout.column, units.speed),
    columns: loads,
    rows: speeds.map((head, c) => ({ ...head, cells: cells.map((row) => row[c]) })),
  };
}
