import { useRouter } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { caseBenchPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { Heading, Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import { CheckTable } from '@/components/verdict/check-table';
import { placeText } from '@/figures/axis-text';
import { BasisMark } from '../basis-mark';
import { basisWords } from '../basis-words';
import { verdictOf } from '../model/case-number';
import { caseVerdict, whyNotJudged } from '../model/case-verdict';
import type { CaseView } from '../model/case-view';
import { parameterText, plantWords } from './case-facts';
import { DeleteCase } from './delete-case';
import { EdgeNote } from './edge-note';
import type { EndOfAxis } from './end-words';

export interface CasePanelProps {
  view: CaseView;
  /** The design whose numbers are shown; null until something was kept. */
  design: { id: string; revision: number } | null;
  worst: boolean;
  capped: boolean;
  ends: readonly EndOfAxis[];
  /** Cases at the same place. */
  alsoHere: readonly CaseView[];
  onOpen: (caseId: string) => void;
  onEdit: (what: string) => void;
  /** The last case cannot be taken away. */
  only: boolean;
}

/** One case: what its plant is there and how well it is known, every check, and whether it stands at the edge of what was checked. */
export function CasePanel({ view, design, worst, capped, ends, alsoHere, onOpen, onEdit, only }: CasePanelProps) {
  const project = useProject();
  const mayEdit = useMayEdit();
  const router = useRouter();
  const { kept, result } = view;
  const reason = whyNotJudged(view);
  return (
    <View role="region" aria-label={`Case ${kept.name}`} style={styles.panel}>
      <View style={styles.head}>
        <View style={styles.title}>
          <Heading level={2}>{kept.name}</Heading>
          <VerdictWord verdict={caseVerdict(view)} />
        </View>
        <Button
          kind="primary"
          label="Open on bench"
          onPress={() => router.push(caseBenchPath(project.id, { caseId: kept.id, design: design ?? undefined }))}
        />
      </View>
      <PlantLines view={view} />
      {alsoHere.length > 0 ? (
        <View style={styles.line}>
          <Text step="note" tone="ink2">
            Also here:
          </Text>
          {alsoHere.map((other) => (
            <Button key={other.kept.id} kind="quiet" label={other.kept.name} onPress={() => onOpen(other.kept.id)} />
          ))}
        </View>
      ) : null}
      {reason ? (
        <Text step="note" tone="ink2">
          {reason}
        </Text>
      ) : null}
      {result?.numbers.closedLoop.stable === false ? <Text tone="fail">Unstable: the numbers have no meaning here.</Text> : null}
      {result && result.checks.length > 0 ? (
        <CheckTable
          label={`Checks of ${view.kept.name}`}
          checks={result.checks.map((check) => ({ ...check, verdict: verdictOf(view, check) }))}
          unstable={!result.numbers.closedLoop.stable}
          outdated={view.outdated}
        />
      ) : null}
      {ends.length > 0 ? (
        <EdgeNote ends={ends} worst={worst} capped={capped} mayEdit={mayEdit} onCheckFurther={() => onEdit('new')} />
      ) : null}
      {mayEdit ? (
        <View style={styles.line}>
          <Button label="Change this case" onPress={() => onEdit(kept.id)} />
          {only ? (
            <Text step="small" tone="ink2">
              The last case stays.
            </Text>
          ) : (
            <DeleteCase kept={kept} />
          )}
        </View>
      ) : null}
    </View>
  );
}

function PlantLines({ view: { kept, now, frozen } }: { view: CaseView }) {
  const { speed } = useUnits();
  const shown = now ?? frozen;
  const place = placeText(kept.axes, speed);
  const changed = parameterText(kept.parameters);
  const words = shown && plantWords(shown);
  const { tag, sentence } = basisWords[kept.basis];
  return (
    <View style={styles.plant}>
      {place && place !== kept.name ? (
        <Text step="note" weight={600}>
          {place}
        </Text>
      ) : null}
      {shown ? (
        <Text step="note" tone="ink2">
          <Text step="note" weight={600}>
            {`${shown.plant.name}, rev ${shown.plant.revision}${kept.plantRevision === null ? ', the latest' : ''}`}
          </Text>
          {changed ? `, with ${changed}. ` : '. '}
          {words ?? ''}
        </Text>
      ) : null}
      <View style={styles.basisLine}>
        <BasisMark basis={kept.basis} />
        <Text step="note" tone="ink2" style={styles.basis}>
          <Text step="note" weight={600}>
            {tag}
          </Text>
          . {sentence}
        </Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: 10 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 12, flexWrap: 'wrap' },
  title: { flexGrow: 1, flexShrink: 1, gap: 4 },
  plant: { gap: 4 },
  line: { flexDirection: 'row', alignItems: 'center', flexWrap: 'wrap', columnGap: 8, rowGap: 6 },
  basisLine: { flexDirection: 'row', alignItems: 'center', gap: 8 },
  basis: { flex: 1 },
});
