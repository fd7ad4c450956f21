import type { FrequencyResponse } from '@/contract';
import type { FrequencyAxis } from './frequency-axis';
import { derivedOrdinate, frequencyPolyline, type Ordinate, ordinatesWithin } from './frequency-curves';
import { betweenStops } from './frequency-window';
import type { Interval, Rect } from './geometry';
import type { Axis } from './linear-axis';
import { oddHalfTurns, phaseAxis, plantMagnitudeAxis } from './loop-axes';
import type { PanelPicture } from './panel';
import { polylinePath } from './polyline';
import type { ReaderUnits } from './quantity-text';
import { type FrequencyUnit, toDecibels } from './units';

/** A plant by itself, and how its reader wants it. */
export interface PlantScene {
  curves: FrequencyResponse;
  /** rad/s */
  corners: Interval;
  /** Exact values at a frequency in rad/s; the magnitude is a factor. */
  at: (frequency: number) => { magnitude: number; phaseDegrees: number };
  units: ReaderUnits;
}

/** What is drawn beyond the slowest and the fastest corner, as a factor. */
const BEYOND = 5;
const WIDEST = 1e6;

/** The frequencies round a plant's corners; of more than six decades the fast end is kept. rad/s */
export function plantWindow([slowest, fastest]: Interval, unit: FrequencyUnit): Interval {
  const high = fastest * BEYOND;
  return betweenStops([Math.max(slowest / BEYOND, high / WIDEST), high], unit);
}

const decibels = derivedOrdinate(({ plant }) => plant.magnitude.map(toDecibels));
const degrees: Ordinate = ({ plant }) => plant.phaseDegrees;

interface Panel {
  title: string;
  unit: string;
  ordinate: Ordinate;
  axis: (values: readonly number[], range: Interval) => Axis;
  strong: (axis: Axis) => readonly number[];
}

function picture({ curves }: PlantScene, across: FrequencyAxis, plot: Rect, panel: Panel): PanelPicture {
  const up = panel.axis(ordinatesWithin(curves, across, panel.ordinate), [plot.y + plot.height, plot.y]);
  const a = polylinePath(frequencyPolyline(curves, panel.ordinate, across, up), plot);
  return {
    title: panel.title,
    unit: panel.unit,
    plot,
    axis: up,
    strong: panel.strong(up),
    curves: { a, b: '', secondA: '', secondB: '', others: '' },
    kerbs: [],
    bars: [],
    dots: [],
    labels: [],
  };
}

/** |P| over frequency, 0 dB its reference where it comes near. */
export const plantMagnitudePanel = (scene: PlantScene, across: FrequencyAxis, plot: Rect): PanelPicture =>
  picture(scene, across, plot, {
    title: '|P|',
    unit: scene.units.magnitude,
    ordinate: decibels,
    axis: (values, range) => plantMagnitudeAxis(values, range, scene.units.magnitude),
    strong: ({ domain: [low, high] }) => (low <= 0 && high >= 0 ? [0] : []),
  });

/** arg P over frequency, dead time included, every odd half turn a reference. */
export const plantPhasePanel = (scene: PlantScene, across: FrequencyAxis, plot: Rect): PanelPicture =>
  picture(scene, across, plot, {
    title: 'arg P',
    unit: 'degrees',
    ordinate: degrees,
    axis: (values, range) => phaseAxis(values, range, 0),
    strong: ({ domain }) => oddHalfTurns(domain),
  });
