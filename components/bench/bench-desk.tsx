import { useCallback, useEffect, useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { CursorProvider } from '@/components/charts';
import { useAnnounce } from '@/components/ui/announcements';
import { BenchContext } from './bench-context';
import type { BenchCommand } from './bench-keys';
import { BenchScene } from './bench-scene';
import { useCompared } from './compare/use-compared';
import type { Gain } from './draft/gain';
import { nudgeGain } from './draft/move-gain';
import { redo, undo } from './draft/draft-store';
import { useDraftStore } from './draft/use-draft-store';
import { useKeep } from './keep/use-keep';
import { whyNotKept } from './keep/saved-words';
import { useBenchAnalysis } from './live/use-bench-analysis';
import { FollowWorst } from './over/follow-worst';
import { useOverCases } from './over/use-over-cases';
import type { BenchSubject } from './subject/bench-subject';
import type { BenchLink, ChangeLink } from './subject/bench-link';
import { focusChart } from './sheets/focus-chart';
import { useBenchKeys } from './use-bench-keys';

interface BenchDeskProps {
  subject: BenchSubject;
  link: BenchLink;
  onLink: ChangeLink;
  /** Hears which case is nearest its limit, whenever the gains rest. */
  onWorst: (caseId: string) => void;
}

/** The bench with something on it: its draft, the engine that answers, what can be kept, and its keys. */
export function BenchDesk({ subject, link, onLink, onWorst }: BenchDeskProps) {
  const store = useDraftStore(subject);
  const live = useBenchAnalysis(subject, store, link.steps);
  const over = useOverCases(subject, store);
  const compared = useCompared(subject, link);
  const { outcome, keep } = useKeep(subject, store);
  const [activeGain, setActiveGain] = useState<Gain>('kp');
  const bench = useMemo(() => ({ subject, store, ...live, over }), [subject, store, live, over]);
  const keptRevision = outcome.kind === 'kept' ? outcome.revision : null;
  useEffect(() => {
    // What a link pinned is no longer what is on the bench once a newer revision was kept here.
    if (keptRevision !== null) onLink({ revision: undefined, analysis: undefined });
  }, [keptRevision, onLink]);

  const announce = useAnnounce();
  const refused = whyNotKept(subject.project);
  const obey = useCallback(
    (command: BenchCommand) => {
      if (command.kind === 'chart') {
        onLink({ chart: command.sheet });
        focusChart(command.sheet);
      } else if (command.kind === 'undo') undo(store);
      else if (command.kind === 'redo') redo(store);
      else if (command.kind === 'nudge') nudgeGain(store.getState(), activeGain, command.fraction);
      else if (refused === null) keep();
      else announce(refused);
    },
    [store, onLink, activeGain, keep, announce, refused],
  );
  const region = useBenchKeys(obey);
  return (
    <BenchContext.Provider value={bench}>
      <CursorProvider>
        <View ref={region} style={styles.desk}>
          <FollowWorst onWorst={onWorst} />
          <BenchScene {...{ link, onLink, compared, outcome, activeGain }} onKeep={keep} onActiveGain={setActiveGain} />
        </View>
      </CursorProvider>
    </BenchContext.Provider>
  );
}

const styles = StyleSheet.create({ desk: { flex: 1, minHeight: 0 } });
