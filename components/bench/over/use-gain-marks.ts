import { useEffect, useState } from 'react';
import { useBench, useDraft } from '../bench-context';
import { current } from '../draft/draft';
import type { Gain } from '../draft/gain';
import type { Form } from '../draft/settings';
import { engines } from '../engine/engines';
import { nearestFirst } from './cases-question';
import type { GainMarks, SideMarks } from './gain-marks';
import { type MarkSide } from './mark-walk';
import { useRestedOverCases } from './use-rested-over-cases';

export type MarksOfGains = Readonly<Partial<Record<Gain, GainMarks>>>;

interface Found {
  readonly form: Form;
  readonly marks: MarksOfGains;
}

const sides: readonly MarkSide[] = ['up', 'down'];
const NOTHING_FOUND: MarksOfGains = {};

/**
 * What each of the gains breaks first when it is turned, the others as they are. Looked for at rest, one gain after the other; a gain that
 * moves again ends the search. What was found stays shown until it is found anew, or the form changes.
 */
export function useGainMarks(gains: readonly Gain[]): MarksOfGains {
  const { conditions, opened } = useBench().subject;
  const form = useDraft((draft) => current(draft).form);
  const rested = useRestedOverCases();
  const [found, setFound] = useState<Found>({ form, marks: NOTHING_FOUND });
  useEffect(() => {
    if (rested === null) return;
    const { settings, answer } = rested;
    const shared = { opened, settings, cases: nearestFirst(conditions, answer.results), limits: conditions.limits };
    let left = false;
    const look = async () => {
      for (const gain of gains) {
        const marks: Partial<Record<MarkSide, SideMarks>> = {};
        for (const side of sides) {
          marks[side] = await engines().search.run('marks', { ...shared, gain, side });
          if (left) return;
        }
        setFound((before) => ({ form: settings.form, marks: { ...(before.form === settings.form && before.marks), [gain]: marks } }));
      }
    };
    void look();
    return () => {
      left = true;
    };
  }, [gains, rested, conditions, opened]);
  return found.form === form ? found.marks : NOTHING_FOUND;
}
