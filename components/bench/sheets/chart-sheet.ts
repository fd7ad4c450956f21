/** The chart sheets of the bench, in the order they are stacked, each with its name and the key that chooses it. */
export const chartSheets = ['bode', 'nyquist', 'sensitivity', 'step', 'load'] as const;
export type ChartSheet = (typeof chartSheets)[number];

interface SheetWords {
  readonly name: string;
  readonly key: string;
}

export const sheetWords: Readonly<Record<ChartSheet, SheetWords>> = {
  bode: { name: 'Bode', key: 'b' },
  nyquist: { name: 'Nyquist', key: 'n' },
  sensitivity: { name: '|S| |T|', key: 's' },
  step: { name: 'Step', key: 't' },
  load: { name: 'Load', key: 'l' },
};

export const isChartSheet = (text: string | undefined): text is ChartSheet => chartSheets.some((sheet) => sheet === text);

export const sheetOfKey = (key: string): ChartSheet | null =>
  chartSheets.find((sheet) => sheetWords[sheet].key === key.toLowerCase()) ?? null;
