import { range } from 'd3-array';
import { formatDegrees, formatFrequency, formatMagnitude, type Interval, type PlantScene, withUnit } from '@/figures';
import type { TableContent } from './data-table';

const ROWS = 40;

/** |P| and arg P at one frequency, without units. */
export function plantCells({ at, units }: PlantScene, frequency: number): [string, string] {
  const { magnitude, phaseDegrees } = at(frequency);
  return [formatMagnitude(magnitude, units.magnitude), formatDegrees(phaseDegrees)];
}

/** "1.00 rad/s, |P| 5.9 dB, arg P −112.8°" */
export function plantCursorText(scene: PlantScene, frequency: number): string {
  const { frequency: unit, magnitude } = scene.units;
  const [gain, phase] = plantCells(scene, frequency);
  return `${withUnit(formatFrequency(frequency, unit), unit)}, |P| ${withUnit(gain, magnitude)}, arg P ${phase}°`;
}

/** The sentence that stands for a plant sheet: where its curves begin and end. */
export function describePlantCurves(scene: PlantScene, [low, high]: Interval): string {
  return `Gain and phase of the plant over frequency. From ${plantCursorText(scene, low)}, to ${plantCursorText(scene, high)}.`;
}

/** Exact values of the plant over the window of its sheet. */
export function plantTable(scene: PlantScene, [low, high]: Interval): TableContent {
  const { frequency: unit, magnitude } = scene.units;
  const rows = range(ROWS)
    .map((i) => low * (high / low) ** (i / (ROWS - 1)))
    .map((frequency) => [formatFrequency(frequency, unit), ...plantCells(scene, frequency)]);
  return { caption: 'Gain and phase of the plant by frequency', columns: [unit, `|P| ${magnitude}`, 'arg P °'], rows };
}
