import { readFileSync } from 'node:fs';
import type { LoopInput } from '@/contract';

interface Point {
  frequency: number | null;
}

/** What another program computed at 50 digits for one loop. */
export interface Expected {
  stable: boolean;
  unstablePoles: number;
  gainCrossovers: (Point & { phaseMarginDegrees: number })[];
  phaseCrossovers: (Point & { gainMarginFactor: number })[];
  gain: (Point & { factor: number }) | null;
  gainReduction: (Point & { factor: number }) | null;
  phase: (Point & { degrees: number }) | null;
  delay: (Point & { seconds: number }) | null;
  ms: Point & { value: number };
  mt: Point & { value: number };
  disk: { alpha: number };
  bandwidth: { closedLoop: number | null; sensitivity: number | null };
  samples: { frequency: number; re: number; im: number; phaseDegrees: number }[];
}

export interface ReferenceLoop {
  id: string;
  title: string;
  loop: LoopInput;
  expect: Expected;
  time?: { times: number[]; reference: number[]; load: number[]; metrics: { steadyStateError: number | null } };
}

const { cases } = JSON.parse(readFileSync('tests/fixtures/loops.json', 'utf8')) as { cases: ReferenceLoop[] };

/** Every loop of the fixture, continuous and sampled. */
export const referenceLoops = cases;

export const continuousLoops = cases.filter(({ loop }) => !loop.sampling);
