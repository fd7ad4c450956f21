import { magnitude, type Complex } from '@/analysis/numbers/complex';

/** `count` panels of equal width, one after the other; the last stage of a plan without period never ends. */
export interface Stage {
  readonly width: number;
  readonly count: number;
}

/** The widest angle |λ|·width that a panel's polynomial follows to 2e-10: (angle/4)⁹·2/9! bounds the interpolation error. */
const PANEL_ANGLE = 1.25;

/** A mode has died when it fell by e^−36, double precision. */
const DEAD_EXPONENT = 36;

/** Panels become wider only where they become this much wider: each width costs an operator of its own. */
const WORTH_WIDENING = 2;

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
    .map(({ re, im }) => ({ rate: magnitude(re, im), death: re < 0 ? DEAD_EXPONENT / -re : Infinity }))
    .sort((a, b) => a.death - b.death);
  const spans: Span[] = [];
  let start = 0;
  const lastUntil = (end: number, widest: number) => {
    const last = spans[spans.length - 1];
    if (last && widest < WORTH_WIDENING * last.widest) last.length += end - start;
    else spans.push({ length: end - start, widest });
    start = end;
  };
  modes.forEach(({ death }, k) => {
    const end = Math.min(death, period);
    if (end <= start) return;
    const fastest = Math.max(...modes.slice(k).map(({ rate }) => rate));
    lastUntil(end, fastest > 0 ? PANEL_ANGLE / fastest : Math.min(end - start, STILL_WIDTH));
  });
  if (start < period) lastUntil(period, start || Math.min(period, STILL_WIDTH));
  return period < Infinity ? spans.map((span) => evenStage(span, fineness)) : doubledStages(spans, fineness);
}

/** A stretch of time and the widest panel that follows what is alive in it. */
interface Span {
  length: number;
  readonly widest: number;
}

/** Panels of at most the given width that fill the length evenly; without end where it has none. */
function evenStage({ length, widest }: Span, fineness: number): Stage {
  if (length === Infinity) return { width: widest / fineness, count: Infinity };
  const count = Math.ceil((length / widest) * fineness);
  return { width: length / count, count };
}

/** Stages that need not fill a period: each panel is the first one's width doubled so often, which makes its operator cheap. */
function doubledStages(spans: readonly Span[], fineness: number): Stage[] {
  const first = evenStage(spans[0], fineness);
  const others = spans.slice(1).map(({ length, widest }) => {
    const width = first.width * 2 ** Math.floor(Math.log2(widest / fineness / first.width));
    return { width, count: Math.ceil(length / width) };
  });
  return [first, ...others];
}
