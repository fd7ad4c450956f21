import { StyleSheet, View } from 'react-native';
import { gridCases } from '@/analysis/project';
import { useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { Segments } from '@/components/ui/segments';
import { Heading, Text } from '@/components/ui/text';
import type { GridList, PlantRevision } from '@/contract';
import { caseAxes } from '@/figures/axis-text';
import { useSignal } from '@/hooks/use-signal';
import { countOf } from '../analyse-again';
import { PlantChoice } from '../edit/plant-choice';
import { namesFor } from '../edit/read-case-form';
import { AxisSection } from './axis-section';
import { gridSize, sizeText, tooLarge } from './grid-size';
import { useGridEditor } from './use-grid-editor';

export interface GridEditorProps {
  plants: readonly PlantRevision[];
  caseCount: number;
  onDone: (caseId?: string) => void;
}

/** "30 km/h, 1,380 kg to 240 km/h, 1,640 kg" */
function fromTo(lists: readonly GridList[] | null): string | null {
  if (lists === null || lists.length === 0) return null;
  const made = gridCases(lists);
  return made.length === 1 ? made[0].name : `${made[0].name} to ${made[made.length - 1].name}`;
}

/** Makes a case of every combination of lists of speeds, masses and grades. */
export function GridEditor({ plants, caseCount, onDone }: GridEditorProps) {
  const { id } = useProject();
  const signal = useSignal();
  const editor = useGridEditor({ projectId: id, plants, caseCount, onDone });
  const { form, counts } = editor;
  const there = form.replace ? 0 : caseCount;
  const size = gridSize(counts);
  const large = tooLarge(counts, there);
  const names = namesFor(editor.plant);
  const places = [
    { value: 'add', label: `beside the ${caseCount} there` },
    { value: 'replace', label: `in place of ${caseCount === 1 ? 'it' : 'them'}` },
  ] as const;
  return (
    <View role="region" aria-label="A grid of cases" style={styles.editor}>
      <Heading level={2}>A grid of cases</Heading>
      <Text tone="ink2">Every combination of the lists becomes a case. Gain factors multiply; anything else belongs to one list.</Text>
      {editor.changed ? <Banner lead="Not made." text="A draft stays on this device." /> : null}
      <Form onSubmit={editor.submit} problem={editor.problem}>
        <PlantChoice
          plants={plants}
          plantId={form.plantId}
          revision={form.plantRevision}
          error={editor.errors.plantRevision}
          onChange={editor.change}
        />
        {caseAxes.map((axis) => (
          <AxisSection
            key={axis}
            axis={axis}
            form={form.axes[axis]}
            names={names}
            speedUnit={form.speedUnit}
            errors={editor.errors}
            onChange={(next) => editor.changeAxis(axis, next)}
          />
        ))}
        <View style={styles.tight}>
          <Text weight={600}>Where they go</Text>
          <Segments
            label="Where they go"
            value={form.replace ? 'replace' : 'add'}
            options={places}
            onChange={(place) => editor.change({ replace: place === 'replace' })}
            stretch
          />
          {form.replace ? (
            <Text step="small" tone="ink2">{`${countOf(caseCount)} of now will be taken away. What was analysed keeps them.`}</Text>
          ) : null}
        </View>
        <View role="status" style={styles.tight}>
          <Text weight={600} tone={large ? 'fail' : 'ink'}>
            {sizeText(counts)}
          </Text>
          {fromTo(editor.lists) ? (
            <Text step="note" tone="ink2">
              {fromTo(editor.lists)}
            </Text>
          ) : null}
          {editor.errors.lists ? (
            <Text step="note" tone="fail">
              {editor.errors.lists}
            </Text>
          ) : null}
        </View>
        <View style={styles.actions}>
          <Button label="Close" onPress={() => onDone()} />
          {editor.changed ? <Button kind="quiet" label="Empty it" onPress={editor.empty} /> : null}
          <Button
            kind="primary"
            label={size > 0 && large === null ? `Make ${countOf(size)}` : 'Make the cases'}
            busyLabel="Making them"
            busy={editor.busy}
            disabled={!signal}
            onPress={editor.submit}
          />
        </View>
      </Form>
    </View>
  );
}

const styles = StyleSheet.create({
  editor: { gap: 14 },
  tight: { gap: 6 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 10 },
});
