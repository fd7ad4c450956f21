import { act, cleanup, fireEvent, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { undo } from '@/components/bench/draft/draft-store';
import { FilterList } from '@/components/bench/settings/filter-list';
import { UnitsProvider } from '@/components/ui/units';
import { defaultPreferences } from '@/hooks/default-preferences';
import { onTheBench } from './bench-harness';

afterEach(cleanup);

const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
const field = (name: string) => screen.getByLabelText<HTMLInputElement>(name);
const notch = { kind: 'notch', frequency: 40, depth: 0.1, width: 0.5 } as const;

describe('the filters of a design', () => {
  it('are added and removed, each a step of undo', () => {
    const { store } = onTheBench(<FilterList />);
    press('Add notch');
    press('Add low-pass');
    expect(store.getState().settings.filters.map(({ kind }) => kind)).toEqual(['notch', 'lowPass']);
    press('Remove Notch 1');
    expect(store.getState().settings.filters.map(({ kind }) => kind)).toEqual(['lowPass']);
    act(() => undo(store));
    act(() => undo(store));
    expect(store.getState().settings.filters.map(({ kind }) => kind)).toEqual(['notch']);
  });

  it('change their order', () => {
    const { store } = onTheBench(<FilterList />, { filters: [notch, { kind: 'lowPass', timeConstant: 0.02 }] });
    press('Low-pass 2, one place earlier');
    expect(store.getState().settings.filters.map(({ kind }) => kind)).toEqual(['lowPass', 'notch']);
    expect(field('Time constant').value).toBe('0.02');
  });

  it('take what is typed at once, and one step of undo when the field is left', () => {
    const { store, analyser } = onTheBench(<FilterList />, { filters: [notch] });
    const before = analyser.get().output!.analysis.sensitivity.ms.value;
    fireEvent.change(field('Depth, gain left'), { target: { value: '0.5' } });
    expect(analyser.get().output!.analysis.sensitivity.ms.value).not.toBe(before);
    expect(store.temporal.getState().pastStates).toHaveLength(0);
    fireEvent.blur(field('Depth, gain left'));
    expect(store.temporal.getState().pastStates).toHaveLength(1);
  });

  it('keep what was typed where it means nothing, say why, and stay as they were', () => {
    const { store } = onTheBench(<FilterList />, { filters: [notch] });
    fireEvent.change(field('Depth, gain left'), { target: { value: '2' } });
    fireEvent.blur(field('Depth, gain left'));
    expect(field('Depth, gain left').value).toBe('2');
    expect(screen.getByText('Depth is from 0 to 1.')).toBeTruthy();
    expect(store.getState().settings.filters).toEqual([notch]);
  });

  it('say what they cost at the crossover', () => {
    const { analyser } = onTheBench(<FilterList />, { filters: [{ kind: 'lowPass', timeConstant: 0.1 }] });
    const crossover = analyser.get().output!.analysis.margins.phase!.frequency;
    const degrees = ((Math.atan(0.1 * crossover) * 180) / Math.PI).toFixed(1);
    expect(screen.getByText(`−${degrees}° at the crossover, ${crossover.toFixed(2)} rad/s`)).toBeTruthy();
  });

  it('take a notch’s frequency in the reader’s unit', () => {
    const { store } = onTheBench(
      <UnitsProvider preferences={{ ...defaultPreferences, frequencyUnit: 'Hz' }}>
        <FilterList />
      </UnitsProvider>,
      { filters: [notch] },
    );
    fireEvent.change(field('Frequency'), { target: { value: '5' } });
    fireEvent.blur(field('Frequency'));
    expect(field('Frequency').value).toBe('5');
    expect(store.getState().settings.filters[0]).toMatchObject({ frequency: 10 * Math.PI });
  });

  it('are eight at most', () => {
    onTheBench(<FilterList />, { filters: Array.from({ length: 8 }, () => ({ kind: 'lowPass' as const, timeConstant: 0.001 })) });
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Add notch' }).disabled).toBe(true);
    expect(screen.getByText('8 is the most. Remove one to add another.')).toBeTruthy();
  });
});
