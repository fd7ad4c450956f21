import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { Profiler } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { createCursorStore, CursorProvider, FrequencySheet, PlaneChart, ReadOut, TimeSheet } from '@/components/charts';
import { formatFrequency } from '@/figures';
import { integrating } from '../../support/chart-designs';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const panels = [{ kind: 'reference' as const, title: 'Speed after a 1 m/s step', unit: 'm/s' }];
const a = integrating();
const b = integrating('B, rev 5', 0.8);

function bench(store = createCursorStore({ frequency: 2, time: 1 })) {
  render(
    <CursorProvider store={store}>
      <FrequencySheet a={a} b={b} units={units} height={400} width={460} />
      <PlaneChart a={a} b={b} units={units} height={400} width={460} />
      <TimeSheet a={a} b={b} units={units} panels={panels} height={300} width={460} />
      <ReadOut a={a} b={b} units={units} layout="table" />
    </CursorProvider>,
  );
  return store;
}

afterEach(cleanup);

describe('the cursor', () => {
  it('moves by a sixtieth of a decade for an arrow key, by a sixth with Shift, in every chart at once', () => {
    const store = bench();
    const onBode = screen.getByRole('slider', { name: 'Cursor, frequency' });
    fireEvent.keyDown(onBode, { key: 'ArrowRight' });
    expect(store.get('frequency')).toBeCloseTo(2 * 10 ** (1 / 60), 12);
    fireEvent.keyDown(onBode, { key: 'ArrowLeft', shiftKey: true });
    const now = 2 * 10 ** (1 / 60 - 1 / 6);
    expect(store.get('frequency')).toBeCloseTo(now, 12);
    const text = `${formatFrequency(now, 'rad/s')} rad/s`;
    expect(onBode.getAttribute('aria-valuetext')).toContain(text);
    expect(screen.getByRole('slider', { name: 'Cursor, frequency along L' }).getAttribute('aria-valuetext')).toContain(text);
    expect(screen.getByRole('table', { name: `Values at ${text}` })).toBeTruthy();
  });

  it('of time is its own', () => {
    const store = bench();
    fireEvent.keyDown(screen.getByRole('slider', { name: 'Cursor, time' }), { key: 'ArrowRight' });
    expect(store.get('time')).toBeGreaterThan(1);
    expect(store.get('frequency')).toBe(2);
  });

  it('follows the pointer to the frequency under it', () => {
    const store = bench();
    const layer = screen.getByRole('slider', { name: 'Cursor, frequency' });
    const [least, most] = ['aria-valuemin', 'aria-valuemax'].map((name) => Number(layer.getAttribute(name)));
    const event = new MouseEvent('pointermove', { bubbles: true });
    Object.defineProperties(event, { offsetX: { value: (460 - 44 - 10) / 2 }, offsetY: { value: 20 } });
    fireEvent(layer, event);
    expect(store.get('frequency')).toBeCloseTo(Math.sqrt(least * most), 9);
  });

  it('on the plane takes the frequency of the nearest point of L', () => {
    const store = bench();
    const layer = screen.getByRole('slider', { name: 'Cursor, frequency along L' });
    const event = new MouseEvent('pointermove', { bubbles: true });
    Object.defineProperties(event, { offsetX: { value: 180 }, offsetY: { value: 320 } });
    fireEvent(layer, event);
    const frequency = store.get('frequency') ?? 0;
    expect(frequency).toBeGreaterThan(0);
    expect(a.at(frequency).im).toBeLessThan(0);
  });

  it('draws only its own layers again when it moves', () => {
    const store = createCursorStore({ frequency: 2 });
    let pictures = 0;
    let designs = 0;
    const counted = { ...a, at: (frequency: number) => ((designs += 1), a.at(frequency)) };
    const chart = <FrequencySheet a={counted} units={units} height={400} width={460} />;
    render(
      <CursorProvider store={store}>
        <Profiler id="sheet" onRender={() => (pictures += 1)}>
          {chart}
        </Profiler>
      </CursorProvider>,
    );
    const before = screen.getByRole('img').innerHTML;
    designs = 0;
    fireEvent.keyDown(screen.getByRole('slider', { name: 'Cursor, frequency' }), { key: 'ArrowRight' });
    expect(screen.getByRole('img').innerHTML).toBe(before);
    expect(designs).toBeLessThanOrEqual(5);
    expect(pictures).toBe(2);
  });
});
