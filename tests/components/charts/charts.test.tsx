import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import type { ReactNode } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { type ChartDesign, CursorProvider, FrequencySheet, PlaneChart, TimeSheet } from '@/components/charts';
import { formatDegrees, formatFactor, formatFrequency, formatMagnitude } from '@/figures';
import { integrating, neverCrosses, unstableLoop, unstablePlant } from '../../support/chart-designs';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const panels = [
  { kind: 'reference' as const, title: 'Speed after a 1 m/s step', unit: 'm/s' },
  { kind: 'control' as const, title: 'Wheel torque for the step', unit: 'kN·m' },
];
const limits = { ms: 1.7, phaseMargin: 45, gainMargin: 2, settlingTime: 6, overshootPercent: 5, controlMaximum: 2 };

const show = (chart: ReactNode) => render(<CursorProvider>{chart}</CursorProvider>);
const sheet = (a: ChartDesign, rest = {}) => show(<FrequencySheet a={a} units={units} height={400} width={460} {...rest} />);
const plane = (a: ChartDesign, rest = {}) => show(<PlaneChart a={a} units={units} height={400} width={460} {...rest} />);
const description = () => screen.getByRole('img').getAttribute('aria-label') ?? '';
const texts = (container: HTMLElement) => [...container.querySelectorAll('text')].map((node) => node.textContent);

afterEach(cleanup);

describe('what a chart says to those who cannot see it', () => {
  it('stability, crossover, margins and peak of the loop', () => {
    const a = integrating();
    sheet(a);
    const { margins, sensitivity } = a.analysis;
    expect(description()).toContain('A, now is stable.');
    expect(description()).toContain(`phase margin ${formatDegrees(margins.phase?.degrees ?? NaN)}°`);
    expect(description()).toContain(`Crossover ${formatFrequency(margins.phase?.frequency ?? NaN, 'rad/s')} rad/s`);
    expect(description()).toContain(`Ms ${formatFactor(sensitivity.ms.value)}`);
  });

  it('that margins have no meaning where the loop is unstable', () => {
    sheet(unstableLoop());
    expect(description()).toContain('unstable');
    expect(description()).toContain('no meaning');
  });

  it('how often L goes round −1, and how often it must', () => {
    plane(unstablePlant());
    expect(description()).toContain('encirclements \u22121, needed \u22121');
  });

  it('that |L| never crosses 1', () => {
    sheet(neverCrosses());
    expect(description()).toContain('|L| never crosses 1.');
  });

  it('what a time sheet shows', () => {
    show(<TimeSheet a={integrating()} units={units} panels={panels} height={300} width={460} />);
    expect(description()).toContain('Speed after a 1 m/s step, Wheel torque for the step, over time.');
    expect(description()).toMatch(/Settles in \d+\.\d\d s\./);
  });
});

describe('an unstable loop', () => {
  it('says so on the picture and strikes its numbers out', () => {
    const { container } = plane(unstableLoop());
    expect(texts(container)).toContain('unstable');
    expect(texts(container)).toContain('no meaning while unstable');
  });

  it('a stable one does not', () => {
    const { container } = plane(integrating());
    expect(texts(container)).not.toContain('unstable');
    expect(texts(container)).toContain(`Ms ${formatFactor(integrating().analysis.sensitivity.ms.value)}`);
  });
});

describe('limits', () => {
  it('are drawn as kerbs where they are given, and only there', () => {
    const kerbs = (container: HTMLElement) => container.querySelectorAll('[stroke="#D0251A"]').length;
    expect(kerbs(sheet(integrating()).container)).toBe(0);
    cleanup();
    const { container } = sheet(integrating(), { limits });
    expect(kerbs(container)).toBeGreaterThan(0);
    expect(texts(container)).toContain('|S| at most 1.70');
    expect(texts(container)).toContain('45°');
  });
});

describe('the table of a chart', () => {
  it('holds the exact values of the loop at its frequencies', () => {
    const a = integrating();
    sheet(a);
    fireEvent.click(screen.getByRole('button', { name: 'Table of the loop over frequency' }));
    const crossover = a.analysis.margins.phase?.frequency ?? NaN;
    const row = screen.getByRole('rowheader', { name: formatFrequency(crossover, 'rad/s') }).closest('[role=row]') as HTMLElement;
    const point = a.at(crossover);
    expect(
      within(row)
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual([
      formatMagnitude(point.magnitude, 'dB'),
      formatDegrees(point.phaseDegrees),
      formatFactor(point.sensitivity),
      formatFactor(point.complementarySensitivity),
    ]);
  });

  it('has columns of B beside those of A, and gives way to the curves again', () => {
    sheet(integrating(), { b: integrating('B, rev 5', 0.8) });
    fireEvent.click(screen.getByRole('button', { name: /^Table/ }));
    expect(screen.getByRole('columnheader', { name: 'B, rev 5: |S|' })).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: /^Curves/ }));
    expect(screen.queryByRole('table')).toBeNull();
    expect(screen.getByRole('img')).toBeTruthy();
  });
});

describe('the plane', () => {
  it('changes from Nyquist to Nichols by its switch', () => {
    plane(integrating());
    expect(description()).toMatch(/^Nyquist/);
    fireEvent.click(screen.getByRole('radio', { name: 'Nichols' }));
    expect(description()).toMatch(/^Nichols/);
  });
});

describe('units', () => {
  it('hold on axes, marks and tables', () => {
    const { container } = sheet(integrating(), { units: { frequency: 'Hz', magnitude: 'factor' } });
    expect(texts(container)).toContain('Hz');
    expect(texts(container).some((text) => text?.startsWith('× '))).toBe(true);
    fireEvent.click(screen.getByRole('button', { name: /^Table/ }));
    expect(screen.getByRole('columnheader', { name: 'Hz' })).toBeTruthy();
  });
});
