import { describe, expect, it } from 'vitest';
import { caseGrid } from '@/components/cases/model/case-grid';
import { caseViews } from '@/components/cases/model/case-view';
import type { Case } from '@/contract';
import { aCase, kmh, sixCases } from '../cases-harness';

const layoutOf = (cases: readonly Case[]) => caseGrid(caseViews(cases, null, null));

describe('cases by their axes', () => {
  it('stand with speed across and load down, each ascending, whatever order they were made in', () => {
    const layout = layoutOf([...sixCases].reverse())!;
    expect(layout.column).toBe('speed');
    expect(layout.columns).toEqual([kmh(30), kmh(40), kmh(80)]);
    expect(layout.rows.map(({ place }) => place)).toEqual([{ mass: 1380 }, { mass: 1500 }]);
    expect(layout.cells[1][0].map(({ kept }) => kept.name)).toEqual(['30 km/h, 1500 kg']);
  });

  it('have a row for each pair of mass and grade', () => {
    const layout = layoutOf(
      [0, 5].flatMap((grade, i) => sixCases.map((one, n) => ({ ...one, id: aCase(100 * i + n).id, axes: { ...one.axes, grade } }))),
    )!;
    expect(layout.rows.map(({ place }) => place)).toEqual([
      { mass: 1380, grade: 0 },
      { mass: 1380, grade: 5 },
      { mass: 1500, grade: 0 },
      { mass: 1500, grade: 5 },
    ]);
  });

  it('run along mass where none has a speed', () => {
    const layout = layoutOf([aCase(1, { axes: { mass: 1500 } }), aCase(2, { axes: { mass: 1380 } })])!;
    expect(layout).toMatchObject({ column: 'mass', columns: [1380, 1500], rowAxes: [] });
    expect(layout.rows).toHaveLength(1);
  });

  it('share a place, leave one empty, or have none at all', () => {
    const twin = { ...sixCases[0], id: aCase(50).id };
    const layout = layoutOf([...sixCases.slice(0, 5), twin, aCase(51)])!;
    expect(layout.cells[0][0]).toHaveLength(2);
    expect(layout.cells[1][2]).toHaveLength(0);
    expect(layout.off.map(({ kept }) => kept.id)).toEqual([aCase(51).id]);
  });

  it('make no grid without an axis', () => {
    expect(layoutOf([aCase(1), aCase(2)])).toBeNull();
  });
});
