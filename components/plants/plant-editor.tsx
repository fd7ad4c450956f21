import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { Column, Columns } from '@/components/ui/columns';
import { Form } from '@/components/ui/form';
import { SheetPage } from '@/components/ui/sheet-page';
import { useLayout } from '@/components/ui/use-layout';
import type { PlantRevision } from '@/contract';
import { useSignal } from '@/hooks/use-signal';
import { OtherNotations } from './notation/other-notations';
import { PlantBode } from './plant-bode';
import { PlantEquation } from './equation/plant-equation';
import { PlantFields } from './plant-fields';
import { RevisionList } from './revision-list';
import { usePlantEditor } from './use-plant-editor';

const FIELDS = { middle: 390, wide: 420 };
const CURVES = 420;

/** Enter or change a plant: fields at the left, what they say in the middle, what that does at the right. */
export function PlantEditor({ latest }: { latest?: PlantRevision }) {
  const project = useProject();
  const layout = useLayout();
  const phone = layout === 'phone';
  const wide = layout === 'wide';
  const signal = useSignal();
  const editor = usePlantEditor(project.id, latest);
  const next = (latest?.revision ?? 0) + 1;
  const actions = (
    <>
      {editor.changed && latest ? <Button kind="quiet" label={`Back to rev ${latest.revision}`} onPress={editor.discard} /> : null}
      <View style={phone ? { flex: 1 } : null}>
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
      </View>
    </>
  );
  const { plant, outdated } = editor.preview;
  const equation = plant ? <PlantEquation plant={plant} outdated={outdated} /> : null;
  const curves = plant ? <PlantBode plant={plant} /> : null;
  return (
    <SheetPage
      title={latest ? `Plant, ${latest.name}` : 'Plant'}
      sub={latest ? `rev ${latest.revision}. Every case builds on it.` : 'What the loop drives.'}
      actions={actions}
      footed={editor.changed}
    >
      {editor.overtaken && latest ? (
        <Banner
          lead={`${latest.createdBy} kept rev ${latest.revision} meanwhile.`}
          text="What you typed was begun on an earlier one and is still here."
          action={<Button label={`Keep mine on top of rev ${latest.revision}`} onPress={editor.adopt} />}
        />
      ) : null}
      {editor.changed ? <Banner lead="Not kept." text="A draft stays on this device." /> : null}
      <Columns>
        <Column width={wide ? FIELDS.wide : FIELDS.middle}>
          <Form onSubmit={editor.submit} problem={editor.problem}>
            <PlantFields
              control={editor.control}
              form={editor.form}
              choice={editor.notation}
              reading={editor.preview.formula}
              readBack={
                <>
                  {phone ? equation : null}
                  {plant ? <OtherNotations plant={plant} /> : null}
                </>
              }
            />
          </Form>
        </Column>
        <Column last={!wide}>
          {phone ? null : equation}
          {wide ? null : curves}
          {latest ? <RevisionList plantId={latest.id} /> : null}
        </Column>
        {wide ? (
          <Column width={CURVES} last>
            {curves}
          </Column>
        ) : null}
      </Columns>
    </SheetPage>
  );
}
