import { useState } from 'react';
import { type Interval, steadyInterval } from '@/figures';

/** The interval that an axis shows: it follows what is wanted only where it must, so that it stands still while a gain moves. */
export function useSteadyInterval(wanted: Interval, measure: (value: number) => number): Interval {
  const [drawn, setDrawn] = useState<Interval>(wanted);
  const next = steadyInterval(drawn, wanted, measure);
  if (next[0] !== drawn[0] || next[1] !== drawn[1]) setDrawn(next);
  return next[0] === drawn[0] && next[1] === drawn[1] ? drawn : next;
}
