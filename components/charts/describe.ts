import type { TimeMetrics } from '@/contract';
import {
  formatDegrees,
  formatFactor,
  formatFrequency,
  formatMagnitude,
  formatNumber,
  formatSeconds,
  type LoopScene,
  type TimePanel,
  withUnit,
} from '@/figures';

const andB = ({ b }: LoopScene): string => (b === undefined ? '' : ` Beside it, dashed: ${b.label}.`);

/** Stability first: the numbers after it mean nothing without. */
function stability({ a }: LoopScene): string {
  const { stable, unstablePoles } = a.analysis.closedLoop;
  if (stable) return `${a.label} is stable.`;
  return `${a.label} is unstable, ${unstablePoles} ${unstablePoles === 1 ? 'pole' : 'poles'} on the wrong side: margins have no meaning.`;
}

/** The sentence that stands for the frequency sheet. */
export function describeFrequency(scene: LoopScene): string {
  const { margins, sensitivity } = scene.a.analysis;
  const { frequency: unit, magnitude } = scene.units;
  const at = (frequency: number) => withUnit(formatFrequency(frequency, unit), unit);
  const phase =
    margins.phase === null
      ? '|L| never crosses 1.'
      : `Crossover ${at(margins.phase.frequency)}, phase margin ${formatDegrees(margins.phase.degrees)}°.`;
  const gain =
    margins.gain === null
      ? 'No finite gain margin.'
      : `Gain margin ${withUnit(formatMagnitude(margins.gain.factor, magnitude), magnitude)}.`;
  const peak = `Ms ${formatFactor(sensitivity.ms.value)}${sensitivity.ms.frequency === null ? '' : ` at ${at(sensitivity.ms.frequency)}`}.`;
  return `Loop gain, phase and sensitivity over frequency. ${stability(scene)} ${phase} ${gain} ${peak}${andB(scene)}`;
}

/** "encirclements 0, needed 0": the count that decides stability. */
export function encirclementText({ a }: LoopScene): { text: string; differ: boolean } {
  const { encirclements, encirclementsNeeded } = a.analysis.closedLoop;
  return {
    text: `encirclements ${encirclements}, needed ${encirclementsNeeded}`.replace(/-/g, '\u2212'),
    differ: encirclements !== encirclementsNeeded,
  };
}

/** The sentence that stands for Nyquist or Nichols. */
export function describePlane(scene: LoopScene, name: string): string {
  const { ms } = scene.a.analysis.sensitivity;
  const unit = scene.units.frequency;
  const where = ms.frequency === null ? '' : ` at ${withUnit(formatFrequency(ms.frequency, unit), unit)}`;
  const distance = formatFactor(scene.a.analysis.margins.modulus);
  const count = encirclementText(scene).text;
  return `${name} curve with contours of |S|. ${stability(scene)} ${count}. Nearest to \u22121: distance ${distance}, Ms ${formatFactor(ms.value)}${where}.${andB(scene)}`;
}

type Metrics = TimeMetrics | null;
const said = (value: number | null | undefined, words: (value: number) => string): string => (value == null ? '' : ` ${words(value)}`);

/** What is said of each panel's response, from the numbers that belong to it. */
const responseWords: Record<TimePanel['kind'], (metrics: Metrics, unit: string) => string> = {
  reference: (metrics) =>
    said(metrics?.settlingTime, (time) => `Settles in ${formatSeconds(time)} s.`) +
    said(metrics?.overshootPercent, (percent) => `Overshoot ${formatDegrees(percent)} %.`),
  load: (metrics, unit) => {
    const at = said(metrics?.loadPeakTime, (time) => `at ${formatSeconds(time)} s`);
    return (
      said(metrics?.loadPeak, (peak) => `The load moves it by at most ${withUnit(formatNumber(peak, 2), unit)}${at}.`) +
      said(metrics?.loadSettlingTime, (time) => `Back after ${formatSeconds(time)} s.`)
    );
  },
  control: (metrics, unit) =>
    said(metrics?.controlPeak, (peak) => `The command moves by at most ${withUnit(formatNumber(peak, 2), unit)}.`),
};

/** The sentence that stands for a time sheet, with the numbers of the panels it has. */
export function describeTime(scene: LoopScene, panels: readonly TimePanel[]): string {
  const metrics = scene.a.analysis.timeResponse?.metrics ?? null;
  const titles = panels.map(({ title }) => title).join(', ');
  const words = panels.map(({ kind, unit }) => responseWords[kind](metrics, unit)).join('');
  return `${titles}, over time. ${stability(scene)}${words}${andB(scene)}`;
}
