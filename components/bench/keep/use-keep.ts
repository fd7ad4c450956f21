import { useCallback, useState } from 'react';
import type { Analysis, DesignRevision, KeptAnalysis } from '@/contract';
import { hasStatus, NoSignal, sentence } from '@/hooks/api/problem';
import { useCreateAnalysis } from '@/hooks/queries/analyses';
import { useCreateDesign, useReviseDesign } from '@/hooks/queries/designs';
import { current } from '../draft/draft';
import type { DraftStore } from '../draft/draft-store';
import { contentWith, settingsOf } from '../draft/settings';
import { engines } from '../engine/engines';
import { benchLoop } from '../live/bench-loop';
import type { BenchSubject } from '../subject/bench-subject';
import { type Agreement, agreementOf } from './agreement';
import type { KeepOutcome } from './keep-outcome';

const FIRST_DESIGN = 'Design 1';
const UNIT_STEPS = { reference: 1, load: 1 };

/** The server's numbers for the case on the bench; null where it computed that case with another revision of the plant. */
function serverNumbers(kept: KeptAnalysis, { plant, shownCase }: BenchSubject): Analysis | null {
  const frozen = kept.inputs.cases.find(({ id }) => id === shownCase.id);
  if (!frozen || frozen.plant.id !== plant.id || frozen.plant.revision !== plant.revision) return null;
  return kept.results.find((result) => result.case.id === shownCase.id)?.numbers ?? null;
}

async function agreementWith(kept: KeptAnalysis | undefined, subject: BenchSubject, revision: DesignRevision): Promise<Agreement | null> {
  const server = kept && serverNumbers(kept, subject);
  if (!server) return null;
  const loop = benchLoop(subject, settingsOf(revision), UNIT_STEPS);
  return agreementOf(await engines().responses.run('analyse', { loop, detail: 'full', end: null }), server);
}

/**
 * Keeps what is on the bench as a revision and has it analysed in the same request; the first one makes the design.
 * Nothing is queued and nothing is lost: where it does not work, the draft stays as it is and the outcome says why.
 */
export function useKeep(subject: BenchSubject, store: DraftStore): { outcome: KeepOutcome; keep(): void } {
  const [outcome, setOutcome] = useState<KeepOutcome>({ kind: 'idle' });
  const projectId = subject.project.id;
  const { mutateAsync: create } = useCreateDesign(projectId);
  const { mutateAsync: revise } = useReviseDesign(projectId, subject.latest?.id ?? '');
  const { mutateAsync: analyse } = useCreateAnalysis(projectId);

  const send = useCallback(async (): Promise<{ revision: DesignRevision; analysis?: KeptAnalysis }> => {
    const { base, note, ...draft } = store.getState();
    const content = { ...contentWith(subject.opened, current({ base, note, ...draft })), ...(note.trim() && { note: note.trim() }) };
    if (base.revision !== null) {
      const revised = await revise({ ...content, baseRevision: base.revision, analyse: true });
      return { revision: revised, analysis: revised.analysis };
    }
    const revision = await create({ name: FIRST_DESIGN, ...content });
    const analysis = await analyse({ designId: revision.id, designRevision: revision.revision }).catch(() => undefined);
    return { revision, analysis };
  }, [subject.opened, store, create, revise, analyse]);

  const attempt = useCallback(async () => {
    store.getState().release();
    setOutcome({ kind: 'keeping' });
    try {
      const { revision, analysis } = await send();
      store.getState().keep({ revision: revision.revision, settings: settingsOf(revision) });
      setOutcome({ kind: 'kept', revision: revision.revision, agreement: await agreementWith(analysis, subject, revision) });
    } catch (error) {
      setOutcome(refusal(error));
    }
  }, [store, send, subject]);
  const keep = useCallback(() => void attempt(), [attempt]);
  return { outcome, keep };
}

function refusal(error: unknown): KeepOutcome {
  if (error instanceof NoSignal) return { kind: 'offline' };
  return { kind: hasStatus(error, 409) ? 'overtaken' : 'refused', detail: sentence(error) };
}
