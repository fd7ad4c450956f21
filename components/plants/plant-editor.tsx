import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Form } from '@/components/ui/form';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { useLayout } from '@/components/ui/use-layout';
import type { PlantRevision } from '@/contract';
import { useSignal } from '@/hooks/use-signal';
import { PlantBode } from './plant-bode';
import { PlantEquation } from './plant-equation';
import { PlantFields } from './plant-fields';
import { RevisionList } from './revision-list';
import { usePlantEditor } from './use-plant-editor';

/** Enter or change a plant: fields at the left, what they say in the middle, what that does at the right. */
export function PlantEditor({ latest }: { latest?: PlantRevision }) {
  const project = useProject();
  const phone = useLayout() === 'phone';
  const signal = useSignal();
  const editor = usePlantEditor(project.id, latest);
  const next = (latest?.revision ?? 0) + 1;
  const keep = (
    <Button
      kind="primary"
      label={`Keep as plant rev ${next}`}
      busyLabel="Keeping"
      busy={editor.busy}
      disabled={!editor.changed || !signal}
      onPress={editor.submit}
      stretch={phone}
      tall={phone}
    />
  );
  const discard =
    editor.changed && latest ? <Button kind="quiet" label={`Back to rev ${latest.revision}`} onPress={editor.discard} /> : null;
  const actions = (
    <>
      {discard}
      {keep}
    </>
  );
  return (
    <Page
      title={latest ? `Plant, ${latest.name}` : 'Plant'}
      sub={latest ? `rev ${latest.revision}. Every case builds on it.` : undefined}
      actions={actions}
    >
      {editor.overtaken && latest ? (
        <Banner
          lead={`${latest.createdBy} kept rev ${latest.revision} meanwhile.`}
          text="What you typed was begun on an earlier one and is still here."
          action={<Button label={`Keep mine on top of rev ${latest.revision}`} onPress={editor.adopt} />}
        />
      ) : null}
      {editor.changed ? <Banner lead="Not kept." text="A draft stays on this device." /> : null}
      <View style={phone ? styles.stack : styles.side}>
        <Paper style={phone ? null : styles.fields}>
          <Form onSubmit={editor.submit} problem={editor.problem}>
            <PlantFields control={editor.control} />
          </Form>
        </Paper>
        <Paper style={[styles.column, !phone && styles.share]}>
          {editor.preview ? <PlantEquation plant={editor.preview} /> : null}
          {latest ? <RevisionList plantId={latest.id} /> : null}
        </Paper>
        {editor.preview ? (
          <Paper style={phone ? null : styles.share}>
            <PlantBode plant={editor.preview} />
          </Paper>
        ) : null}
      </View>
      {phone ? <Paper style={styles.column}>{actions}</Paper> : null}
    </Page>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', flexWrap: 'wrap', gap: 14, alignItems: 'flex-start' },
  stack: { gap: 8 },
  fields: { width: 400 },
  column: { gap: 20 },
  share: { flexGrow: 1, flexBasis: 380, minWidth: 0 },
});
