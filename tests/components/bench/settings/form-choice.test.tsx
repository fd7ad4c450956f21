import { act, cleanup, fireEvent, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { isMoved } from '@/components/bench/draft/draft';
import { redo, undo } from '@/components/bench/draft/draft-store';
import { FormChoice } from '@/components/bench/settings/form-choice';
import { onTheBench } from './bench-harness';

afterEach(cleanup);

const pid = { kp: 1.05, integral: 0.42, derivative: 0.3, filterTime: 0.035 };
const choose = (name: string) => fireEvent.click(screen.getByRole('radio', { name }));
const form = (name: string) => within(screen.getByRole('group', { name: `The same in ${name} form` }));

describe('the form of the controller', () => {
  it('changes without changing a margin, and is taken back by undo', () => {
    const { store, analyser } = onTheBench(<FormChoice />, pid);
    const before = analyser.get().output!.analysis.margins;
    choose('Series');
    expect(store.getState().settings.form).toBe('series');
    const after = analyser.get().output!.analysis.margins;
    expect(after.phase!.degrees).toBeCloseTo(before.phase!.degrees, 8);
    expect(after.gain!.factor).toBeCloseTo(before.gain!.factor, 8);
    expect(isMoved(store.getState())).toBe(true);
    act(() => undo(store));
    expect(store.getState().settings).toMatchObject({ form: 'parallel', ...pid });
    act(() => redo(store));
    choose('Parallel');
    expect(isMoved(store.getState())).toBe(false);
  });

  it('stands beside the other forms with their units, which follow a move', () => {
    const { store } = onTheBench(<FormChoice />, pid);
    expect(form('ideal').getByText('2.50 s')).toBeTruthy();
    expect(form('ideal').getByText('1.05 kN·m/(m/s)')).toBeTruthy();
    act(() => store.getState().hold({ integral: 0.21 }));
    expect(form('ideal').getByText('5.00 s')).toBeTruthy();
  });

  it('that cannot say the controller is refused with the reason, and nothing changes', () => {
    const { store } = onTheBench(<FormChoice />, { ...pid, kp: 0.5, integral: 2 });
    choose('Series');
    expect(store.getState().settings.form).toBe('parallel');
    expect(screen.getAllByText(/complex pair/)).toHaveLength(2);
    act(() => store.getState().move({ kp: 3 }));
    expect(screen.queryByText(/complex pair/)).toBeNull();
  });

  it('warns in words where a converted gain is negative', () => {
    onTheBench(<FormChoice />, { form: 'series', kp: 1, integral: 2.5, derivative: 0.01, filterTime: 0.035 });
    expect(screen.getByText(/in parallel form one of the gains is negative/)).toBeTruthy();
    expect(form('ideal').getByText(/Ti or Td would be negative/)).toBeTruthy();
  });

  it('says for series on what the set-point weights act', () => {
    onTheBench(<FormChoice />, { ...pid, form: 'series', integral: 2, derivative: 0.3 });
    expect(screen.getByText(/Weights b and c act on the converted parallel gains/)).toBeTruthy();
  });

  it('with times switches integral action off, and on again as it was', () => {
    const { store } = onTheBench(<FormChoice />, pid);
    expect(screen.queryByRole('radiogroup', { name: 'Integral action' })).toBeNull();
    choose('Ideal');
    choose('Off');
    expect(store.getState().settings.integral).toBeNull();
    expect(form('parallel').getByText('0.00 kN·m/((m/s)·s)')).toBeTruthy();
    choose('On');
    expect(store.getState().settings.integral).toBe(2.5);
  });
});
