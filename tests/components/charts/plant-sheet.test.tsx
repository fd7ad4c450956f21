import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { plantResponse } from '@/analysis';
import { createCursorStore, CursorProvider, PlantReadOut, PlantSheet } from '@/components/charts';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const response = plantResponse({ kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 });

afterEach(cleanup);

function sheet(store = createCursorStore({ frequency: 1 })) {
  render(
    <CursorProvider store={store}>
      <PlantSheet {...response} units={units} height={400} width={400} />
      <PlantReadOut scene={{ ...response, units }} rest={1} />
    </CursorProvider>,
  );
  return store;
}

describe('the chart of a plant', () => {
  it('says in words where its curves begin and end', () => {
    sheet();
    expect(screen.getByRole('img', { name: /^Gain and phase of the plant over frequency\. From 0\.50 rad\/s/ })).toBeTruthy();
  });

  it('has a cursor for the keyboard that says the exact plant', () => {
    const store = sheet();
    const cursor = screen.getByRole('slider', { name: 'Cursor, frequency' });
    // 20·log10(2.1/|1 + 0.35j|) and −90° − atan(0.35) − 0.08 rad, by hand.
    expect(cursor.getAttribute('aria-valuetext')).toBe('1.00 rad/s, |P| 5.9 dB, arg P −113.9°');
    fireEvent.keyDown(cursor, { key: 'ArrowRight', shiftKey: true });
    expect(store.get('frequency')).toBeCloseTo(10 ** (1 / 6), 12);
  });

  it('gives the same numbers as a table', () => {
    sheet();
    fireEvent.click(screen.getByRole('button', { name: 'Table of the plant over frequency' }));
    expect(screen.getAllByRole('columnheader').map(({ textContent }) => textContent)).toEqual(['rad/s', '|P| dB', 'arg P °']);
    expect(screen.getAllByRole('rowheader')[0].textContent).toBe('0.50');
  });
});
