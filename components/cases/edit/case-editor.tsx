import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { Heading } from '@/components/ui/text';
import type { Case, PlantRevision } from '@/contract';
import { useSignal } from '@/hooks/use-signal';
import { BothVersions } from './both-versions';
import { CaseFields } from './case-fields';
import { useCaseEditor } from './use-case-editor';

export interface CaseEditorProps {
  what: string;
  kept: Case | undefined;
  plants: readonly PlantRevision[];
  /** Names the case that was kept; nothing where the editor was closed. */
  onDone: (caseId?: string) => void;
}

/** Makes a case, or changes one. */
export function CaseEditor({ what, kept, plants, onDone }: CaseEditorProps) {
  const { id } = useProject();
  const signal = useSignal();
  const editor = useCaseEditor({ projectId: id, what, kept, plants, onDone });
  const title = kept ? `Change ${kept.name}` : 'A new case';
  return (
    <View role="region" aria-label={title} style={styles.editor}>
      <Heading level={2}>{title}</Heading>
      {editor.theirs ? (
        <BothVersions mine={editor.form} theirs={editor.theirs} plants={plants} onKeepMine={editor.adopt} onTakeTheirs={editor.discard} />
      ) : null}
      {editor.gone ? <Banner lead="This case was deleted meanwhile." text="What you typed is still here, and makes a new one." /> : null}
      {editor.changed && !editor.theirs ? <Banner lead="Not kept." text="A draft stays on this device." /> : null}
      <Form onSubmit={editor.submit} problem={editor.problem}>
        <CaseFields form={editor.form} plants={plants} plant={editor.plant} errors={editor.errors} onType={editor.type} />
        <View style={styles.actions}>
          <Button label="Close" onPress={() => onDone()} />
          {editor.changed ? <Button kind="quiet" label={kept ? 'Back to what is kept' : 'Empty it'} onPress={editor.discard} /> : null}
          <Button
            kind="primary"
            label={kept ? 'Keep the case' : 'Add the case'}
            busyLabel="Keeping"
            busy={editor.busy}
            disabled={!signal || editor.theirs !== null || (kept !== undefined && !editor.changed)}
            onPress={editor.submit}
          />
        </View>
      </Form>
    </View>
  );
}

const styles = StyleSheet.create({
  editor: { gap: 12 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 10 },
});
