import { describe, expect, it } from 'vitest';
import { cellBar, cellLimit, edgeRuler, lapChart, type LapChartInput } from '@/figures';

const line = (name: string, values: readonly (number | null)[]) => ({
  name,
  points: [30, 40, 80].map((at, i) => ({ at, value: values[i] })),
});

const input: LapChartInput = {
  width: 700,
  height: 360,
  lines: [line('1,380 kg', [1.63, 1.51, 1.36]), line('1,500 kg', [1.56, 1.46, 1.32])],
  demands: [{ bound: 'max', limit: 1.7, text: 'at most 1.70' }],
  worst: { line: 0, point: 0, text: ['1.63 at 4.84 rad/s', 'at the edge of what was checked'] },
  beyond: { low: 'not checked', high: null },
  tickText: String,
};
const numbersIn = (path: string) => (path.match(/-?\d+(\.\d+)?/g) ?? []).map(Number);

describe('one number over speed', () => {
  it('draws a line for each load, the worst one strong, higher where the number is', () => {
    const { lines } = lapChart(input);
    expect(lines.map(({ strong }) => strong)).toEqual([true, false]);
    expect(lines[0].discs[0].y).toBeLessThan(lines[0].discs[2].y);
    expect(lines[0].discs[0].y).toBeLessThan(lines[1].discs[0].y);
  });

  it('singles the worst out, and writes beside it inside the plot', () => {
    const { worst, lines, labels, plot } = lapChart(input);
    expect(worst).toEqual(lines[0].discs[0]);
    const label = labels.find(({ tone }) => tone === 'strong')!;
    expect(label.lines[0]).toBe('1.63 at 4.84 rad/s');
    expect(label.place.box.x).toBeGreaterThanOrEqual(plot.x);
    expect(label.place.box.x + label.place.box.width).toBeLessThanOrEqual(plot.x + plot.width);
  });

  it.each([
    ['above a greatest value', 'max' as const, (y: number, edge: number) => y <= edge],
    ['below a least value', 'min' as const, (y: number, edge: number) => y >= edge],
  ])('lays the kerb %s', (_where, bound, beyond) => {
    const [kerb] = lapChart({ ...input, demands: [{ bound, limit: 1.5, text: '' }] }).kerbs;
    const [, edge] = numbersIn(kerb.edge);
    const ys = numbersIn(kerb.ground).filter((_, i) => i % 2 === 1);
    expect(ys.every((y) => beyond(y, edge))).toBe(true);
    expect(Math.max(...ys) - Math.min(...ys)).toBeGreaterThan(4);
  });

  it('bars what lies beyond the slowest case, and nothing where nothing can', () => {
    const { beyond, lines, plot, labels } = lapChart(input);
    expect(beyond).toHaveLength(1);
    expect(beyond[0].x).toBe(plot.x);
    expect(beyond[0].x + beyond[0].width).toBeCloseTo(lines[0].discs[0].x, 6);
    expect(labels.some(({ lines: words }) => words.join(' ') === 'not checked')).toBe(true);
    expect(lapChart({ ...input, beyond: { low: null, high: null } }).beyond).toEqual([]);
  });

  it('leaves a gap where a case has no number', () => {
    const { lines } = lapChart({ ...input, worst: null, lines: [line('', [1.6, null, 1.3])] });
    expect(lines[0].discs).toHaveLength(2);
    expect(lines[0].path).not.toMatch(/NaN/);
  });

  it('names loads and limits at the right without one on another', () => {
    const loads = [0, 1, 2, 3, 4, 5].map((n) => line(`${1400 + n} kg`, [1.5, 1.4, 1.3 + n / 1000]));
    const { names } = lapChart({ ...input, lines: loads, worst: null });
    expect(names).toHaveLength(7);
    const ys = names.map(({ y }) => y).sort((a, b) => a - b);
    for (let i = 1; i < ys.length; i++) expect(ys[i] - ys[i - 1]).toBeGreaterThanOrEqual(14.9);
  });

  it('names fewer places where they stand too close', () => {
    const points = Array.from({ length: 60 }, (_, i) => ({ at: 1000 + i, value: 1.3 }));
    const { columns } = lapChart({ ...input, worst: null, lines: [{ name: '', points }] });
    const named = columns.filter(({ text }) => text !== null);
    expect(columns).toHaveLength(60);
    expect(named.length).toBeLessThan(30);
    expect(named[0].text).toBe('1000');
  });

  it('stands with one case, and with none that has a number', () => {
    expect(lapChart({ ...input, worst: null, lines: [{ name: '', points: [{ at: 30, value: 1.5 }] }] }).lines[0].discs).toHaveLength(1);
    expect(() => lapChart({ ...input, worst: null, demands: [], lines: [line('', [null, null, null])] })).not.toThrow();
  });
});

describe('the bar at the foot of a cell', () => {
  it('stands on the edge ruler’s scale', () => {
    const { baseline, limit, target } = edgeRuler({ width: 1022, height: 30, uses: [], worst: null, hasTarget: true, named: false });
    const share = (x: number) => (x - baseline.from) / 1000;
    expect(cellLimit).toBeCloseTo(share(limit), 6);
    expect(cellBar(0)).toBeCloseTo(share(target), 6);
    expect([cellBar(-100), cellBar(100)]).toEqual([0, 1]);
  });
});
