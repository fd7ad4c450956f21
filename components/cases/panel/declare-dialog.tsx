import { useState } from 'react';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Form } from '@/components/ui/form';
import { parseNumber } from '@/components/ui/parse-number';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { axisTyped } from '@/figures/axis-text';
import { speedFrom } from '@/figures/units';
import { hasStatus, sentence } from '@/hooks/api/problem';
import { useUpdateProject } from '@/hooks/queries/projects';
import { declareEnd } from './declare-end';
import { beyondText, declaredText, endName, type EndOfAxis } from './end-words';

/** Says that nothing can lie beyond an end of what was checked, or takes that back. */
export function DeclareDialog({ end, onClose }: { end: EndOfAxis | null; onClose: () => void }) {
  const title = end === null ? '' : `${end.edge.physical ? 'Take back' : 'Declare'} ${endName(end.edge)}?`;
  return (
    <Dialog open={end !== null} title={title} onClose={onClose}>
      {end === null ? null : <DeclareForm end={end} onClose={onClose} />}
    </Dialog>
  );
}

/** A speed in the reader's unit as m/s; null where the field is empty, undefined where it holds no speed. */
function readSpeed(text: string, unit: 'm/s' | 'km/h'): number | null | undefined {
  if (text.trim() === '') return null;
  const typed = parseNumber(text);
  return typed === null || typed < 0 ? undefined : speedFrom(unit, typed);
}

const NO_SPEED = 'A speed of 0 or more, or nothing.';

function DeclareForm({ end, onClose }: { end: EndOfAxis; onClose: () => void }) {
  const project = useProject();
  const { speed } = useUnits();
  const announce = useAnnounce();
  const update = useUpdateProject(project);
  const { edge, declared, at } = end;
  const lets = edge.axis === 'speed' && edge.end === 'low' && !edge.physical;
  const typed = (value: number | null | undefined) => (value === null || value === undefined ? '' : axisTyped('speed', value, speed));
  const [disengage, setDisengage] = useState(typed(declared?.disengage ?? at));
  const [engage, setEngage] = useState(typed(declared?.engage));
  const [below, from] = [readSpeed(disengage, speed), readSpeed(engage, speed)];
  const early = typeof below === 'number' && typeof from === 'number' && from < below;
  const wrong = lets && (below === undefined || from === undefined || early);
  const decide = () => {
    if (wrong) return;
    const speeds = lets ? { disengage: below, engage: from } : {};
    const operatingRange = declareEnd(project.operatingRange, { ...edge, physical: !edge.physical, ...speeds });
    const done = edge.physical ? 'Taken back.' : `Declared: ${beyondText(end, speed)} can happen.`;
    update.mutate(
      { operatingRange },
      {
        onSuccess: () => {
          announce(done);
          onClose();
        },
      },
    );
  };
  const meanwhile = hasStatus(update.error, 412);
  return (
    <Form onSubmit={decide} problem={update.error && !meanwhile ? sentence(update.error) : null}>
      <Text tone="ink2">
        {edge.physical
          ? `Declared now: ${declaredText(end, speed)}. Without it a worst case there is tight at best.`
          : `It says that ${beyondText(end, speed)} can happen, and stands on what goes to the car. A worst case there is then no longer capped at tight.`}
      </Text>
      {lets ? (
        <>
          <Field
            label="The loop lets go below"
            unit={speed}
            numeric
            inputMode="decimal"
            value={disengage}
            onChangeText={setDisengage}
            error={below === undefined ? NO_SPEED : undefined}
            hint="Left empty where it never lets go."
          />
          <Field
            label="It takes up again from"
            unit={speed}
            numeric
            inputMode="decimal"
            value={engage}
            onChangeText={setEngage}
            error={from === undefined ? NO_SPEED : early ? 'The loop takes up no lower than it lets go.' : undefined}
            hint="May be left empty."
          />
        </>
      ) : null}
      {meanwhile ? (
        <Text tone="fail">
          {`Someone changed the project meanwhile. ${edge.physical ? 'It is still to be taken back' : 'Yours is still to be declared'}: press again to put it on top of theirs.`}
        </Text>
      ) : null}
      <DialogDecision
        label={edge.physical ? 'Take it back' : 'Declare it'}
        busyLabel="Declaring"
        busy={update.isPending}
        onDecide={decide}
        onClose={onClose}
      />
    </Form>
  );
}
