import { rulerScale } from './edge-ruler';
import { clamp } from './geometry';

const { low, high } = rulerScale;
const share = (use: number): number => (clamp(use, low, high) - low) / (high - low);

/** Where the limit stands at the foot of a case's cell, as a share of its width: the edge ruler's scale, so that cells and rulers line up. */
export const cellLimit = share(1);

/** How far the bar at the foot of a cell reaches, as a share of its width; `use` 0 is the target, 1 the limit. */
export const cellBar = (use: number): number => share(use);
