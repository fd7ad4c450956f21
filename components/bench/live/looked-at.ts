import type { Detail } from '../engine/engine-tasks';

/**
 * What the screen shows of the loop at this moment: while a gain moves, the engine leaves out what nobody sees. Read once a frame;
 * changing it renders nothing.
 */
export interface LookedAt {
  readonly parts: 'all' | 'frequency' | 'responses';
  /** Where the time axis ends, s; null while that is not known. It stands still while a gain moves. */
  readonly end: number | null;
}

export interface LookedAtStore {
  get(): LookedAt;
  set(change: Partial<LookedAt>): void;
}

export function createLookedAt(start: LookedAt): LookedAtStore {
  let value = start;
  return {
    get: () => value,
    set(change) {
      value = { ...value, ...change };
    },
  };
}

const steps: Readonly<Record<LookedAt['parts'], readonly Detail[]>> = {
  all: ['outline', 'live'],
  frequency: ['outline'],
  responses: ['live'],
};

/** What is computed while a gain moves: the curves over frequency, and the responses beside them. */
export const stepsFor = ({ parts }: LookedAt): readonly Detail[] => steps[parts];
