import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { CaseGrid } from '@/components/cases/grid/case-grid';
import { caseGrid } from '@/components/cases/model/case-grid';
import { caseNumber } from '@/components/cases/model/case-number';
import { worstNumber } from '@/components/cases/model/worst-number';
import { UnitsProvider } from '@/components/ui/units';
import { defaultPreferences } from '@/hooks/default-preferences';
import { aCase, sixCases, sixNumbers, viewsOf } from '../cases-harness';

afterEach(cleanup);

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const twin = { ...sixCases[5], id: aCase(50).id, name: 'twin' };
const cases = [...sixCases.slice(0, 4), sixCases[5], twin];
const numbers = [0, 1, 2, 3, 5, 5].map((i) => sixNumbers[i]);

function show(onOpen = vi.fn()) {
  const views = viewsOf(cases, numbers);
  const all = views.map((view) => caseNumber(view, 'ms', units));
  render(
    <UnitsProvider preferences={{ ...defaultPreferences, speedUnit: 'km/h' }}>
      <CaseGrid
        layout={caseGrid(views)!}
        quantity="ms"
        numbers={new Map(all.map((number) => [number.view.kept.id, number]))}
        worst={worstNumber(all, 'ms')}
        selected={sixCases[0].id}
        onOpen={onOpen}
      />
    </UnitsProvider>,
  );
  return onOpen;
}

const cells = () => screen.getAllByRole('gridcell');
const focused = () => document.activeElement?.getAttribute('aria-label') ?? '';
const press = (key: string) => fireEvent.keyDown(document.activeElement!, { key });

describe('the grid of cases', () => {
  it('says of every cell its case, number, verdict and how well it is known, and which is nearest the edge', () => {
    show();
    expect(cells().map((cell) => cell.getAttribute('aria-label'))).toContain(
      '30 km/h, 1380 kg, Ms 1.63, tight, extrapolated, nearest the edge of all',
    );
    expect(screen.getByRole('gridcell', { name: '40 km/h, 1380 kg, Ms 1.51, pass, measured' })).toBeTruthy();
    expect(screen.getByRole('gridcell', { name: 'no case here' })).toBeTruthy();
  });

  it('is one stop for Tab, at the case that is open', () => {
    show();
    const stops = cells().filter((cell) => cell.tabIndex === 0 && cell.hasAttribute('tabindex'));
    expect(stops.map((cell) => cell.getAttribute('aria-selected'))).toEqual(['true']);
  });

  it('has speeds down in a narrow page, is walked by arrows over places that hold no case, and opened by the space bar', () => {
    const onOpen = show();
    screen.getByRole('gridcell', { name: /^30 km\/h, 1380/ }).focus();
    press('ArrowDown');
    expect(focused()).toMatch(/^40 km\/h, 1380/);
    press('ArrowDown');
    press('End');
    expect(focused()).toMatch(/^80 km\/h, 1500/);
    press('ArrowUp');
    expect(focused()).toMatch(/^30 km\/h, 1500/);
    press(' ');
    expect(onOpen).toHaveBeenLastCalledWith(sixCases[3].id);
  });
});
