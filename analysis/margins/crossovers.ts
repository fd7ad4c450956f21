import { limitOf } from './end-values';
import type { LoopFunction } from './loop-function';
import { visitPieces } from './pieces';
import type { Probe } from './probe';
import { loopGain, loopPhase } from './quantities';
import { ZERO_GAIN } from './least-gain';

/** A point where |L| = 1. The phase is unwrapped, radians. */
export interface GainCrossover {
  readonly frequency: number;
  readonly phase: number;
}

/** A point where L is real and negative. `frequency` null: as ω → ∞. */
export interface PhaseCrossover {
  readonly frequency: number | null;
  readonly gain: number;
}

/** A neutral loop's crossovers never end; the list does. */
export const MOST_NEUTRAL_CROSSOVERS = 200;
const TURN = 2 * Math.PI;
/** A phase that changes less than this between two rows stands still: L on the real axis is then a stretch, not a crossing. */
const STRETCH = 1e-12;

/** All ω > 0 with |L(jω)| = 1, ascending. */
export const gainCrossovers = (probe: Probe): GainCrossover[] => {
  const found: GainCrossover[] = [];
  visitPieces(probe, loopGain, {
    matters: (least, most) => least <= 0 && most >= 0,
    visit: ({ a, valueA, b, valueB }) => {
      if (valueA > 0 === valueB > 0) return;
      const frequency = probe.crossing(loopGain, 0, { a, valueA, b, valueB });
      found.push({ frequency, phase: probe.found[loopPhase] });
    },
  });
  return found;
};

/** All ω ≥ 0 with L real and negative, ascending, the end of the axis last. */
export const phaseCrossovers = (loop: LoopFunction, probe: Probe): PhaseCrossover[] => {
  const found: PhaseCrossover[] = [];
  const atZero = limitOf(loop.atZero.loop, 'zero');
  if (Number.isFinite(atZero) && atZero < -ZERO_GAIN) found.push({ frequency: 0, gain: -atZero });
  const limit = loop.deadTime > 0 ? limitOf(loop.atInfinity.loop, 'infinity') : 0;
  const most = limit === 0 ? Infinity : MOST_NEUTRAL_CROSSOVERS;
  const least = Math.log(loop.leastListedGain);
  visitPieces(probe, loopPhase, {
    matters: (low, high, i) => firstLevel(low) <= high && Math.max(probe.valueAt(i, loopGain), probe.valueAt(i + 1, loopGain)) >= least,
    visit: ({ a, valueA, b, valueB }) => {
      const levels = levelsBetween(valueA, valueB);
      for (const level of levels) {
        const frequency = probe.crossing(loopPhase, level, { a, valueA, b, valueB });
        const log = probe.found[loopGain];
        if (log >= least) found.push({ frequency, gain: Math.exp(log) });
        if (found.length >= most) return true;
      }
    },
  });
  const atInfinity = limitOf(loop.atInfinity.loop, 'infinity');
  if (loop.deadTime === 0 && Number.isFinite(atInfinity) && atInfinity < -loop.leastListedGain)
    found.push({ frequency: loop.end, gain: -atInfinity });
  return found;
};

/** The least −π − 2πk that is not below `phase`. */
const firstLevel = (phase: number): number => Math.ceil((phase + Math.PI) / TURN) * TURN - Math.PI;

/** Every −π − 2πk after one phase up to and including another, in the order in which they are met. */
const levelsBetween = (from: number, to: number): number[] => {
  if (Math.abs(to - from) < STRETCH) return [];
  const levels: number[] = [];
  const [low, high] = from < to ? [from, to] : [to, from];
  for (let level = firstLevel(low); level <= high; level += TURN) if (level !== from) levels.push(level);
  return from < to ? levels : levels.reverse();
};
