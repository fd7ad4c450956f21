import type { FrequencyResponse } from '@/contract';
import type { FrequencyAxis } from './frequency-axis';
import type { Rect } from './geometry';
import type { Axis } from './linear-axis';
import { responseOf, type LoopScene } from './loop-picture';
import { indicesWithin } from './margin-marks';
import { placementOf } from './placement';
import { type Polyline, polylinePath, toPolyline } from './polyline';
import { remember } from './remember';

/** Takes one ordinate out of a response, in the units of the panel's axis. */
export type Ordinate = (response: FrequencyResponse) => readonly number[];

/** An ordinate that is computed from a response, once for each. */
export function derivedOrdinate(derive: Ordinate): Ordinate {
  const derived = remember<FrequencyResponse, readonly number[]>();
  return (response) => derived(response, [], () => derive(response));
}

/** The ordinates of a response inside the axis' window. */
export function ordinatesWithin(response: FrequencyResponse, axis: FrequencyAxis, ordinate: Ordinate): readonly number[] {
  if (response.frequencies.length === 0) return [];
  const [first, last] = indicesWithin(response, axis.domain);
  return ordinate(response).slice(first, last + 1);
}

const lines = remember<readonly number[], Polyline>();

/** The curve of one ordinate in pixels, the window's part of it. */
export function frequencyPolyline(response: FrequencyResponse, ordinate: Ordinate, across: FrequencyAxis, up: Axis): Polyline {
  if (response.frequencies.length === 0) return toPolyline([], [], across.at, up.at);
  return lines(ordinate(response), [...placementOf(across), ...placementOf(up)], () => {
    const [first, last] = indicesWithin(response, across.domain);
    return toPolyline(response.frequencies.slice(first, last + 1), ordinatesWithin(response, across, ordinate), across.at, up.at);
  });
}

/** Where a panel stands and how it is scaled. */
export interface PanelFrame {
  readonly across: FrequencyAxis;
  readonly up: Axis;
  readonly plot: Rect;
}

export interface FrequencyCurves {
  readonly a: Polyline;
  readonly b: Polyline | null;
  readonly paths: { readonly a: string; readonly b: string; readonly others: string };
}

/** The curves of one ordinate for A, B and the other cases. */
export function frequencyCurves(scene: LoopScene, ordinate: Ordinate, { across, up, plot }: PanelFrame): FrequencyCurves {
  const draw = (response: FrequencyResponse) => frequencyPolyline(response, ordinate, across, up);
  const a = draw(responseOf(scene.a));
  const b = scene.b === undefined ? null : draw(responseOf(scene.b));
  const others = (scene.others ?? []).map((response) => polylinePath(draw(response), plot)).join('');
  return { a, b, paths: { a: polylinePath(a, plot), b: b === null ? '' : polylinePath(b, plot), others } };
}
