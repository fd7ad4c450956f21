import type { Complex } from '@/analysis/numbers/complex';

/** `count` panels of equal width, one after the other; the last stage of a plan without period never ends. */
export interface Stage {
  readonly width: number;
  readonly count: number;
}

/** The widest angle |λ|·width that a panel's polynomial follows to 2e-10: (angle/4)⁹·2/9! bounds the interpolation error. */
const PANEL_ANGLE = 1.25;

/** A mode has died when it fell by e^−36, double precision. */
const DEAD_EXPONENT = 36;

/** Width where nothing moves: any does. */
const STILL_WIDTH = 1;

/**
 * Panels of time fine enough for every mode e^(λt) that is still alive: narrow after the start, wider as fast modes die.
 *
 * With a period (the dead time) the plan covers one period and begins anew in each, because every jump that comes round
 * through the dead time wakes the fast modes again. `fineness` divides all widths.
 */
export function planPanels(poles: readonly Complex[], period: number, fineness = 1): Stage[] {
  const modes = poles
    .map(({ re, im }) => ({ rate: Math.hypot(re, im), death: re < 0 ? DEAD_EXPONENT / -re : Infinity }))
    .sort((a, b) => a.death - b.death);
  const stages: Stage[] = [];
  let start = 0;
  modes.forEach(({ death }, k) => {
    const end = Math.min(death, period);
    if (end <= start) return;
    const fastest = Math.max(...modes.slice(k).map(({ rate }) => rate));
    stages.push(stageOf(end - start, fastest > 0 ? PANEL_ANGLE / fastest : Math.min(end - start, STILL_WIDTH), fineness));
    start = end;
  });
  if (start < period) stages.push(stageOf(period - start, start || Math.min(period, STILL_WIDTH), fineness));
  return stages;
}

/** Panels of at most the given width that fill the length evenly; without end where it has none. */
function stageOf(length: number, widest: number, fineness: number): Stage {
  if (length === Infinity) return { width: widest / fineness, count: Infinity };
  const count = Math.ceil((length / widest) * fineness);
  return { width: length / count, count };
}
