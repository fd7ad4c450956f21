import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { useSignal } from '@/hooks/use-signal';
import { DeclareDialog } from './declare-dialog';
import { beyondText, declaredText, endName, type EndOfAxis, together } from './end-words';

export interface EdgeNoteProps {
  ends: readonly EndOfAxis[];
  /** The case that the headline comes from, and whether its verdict is tight for standing here alone. */
  worst: boolean;
  capped: boolean;
  mayEdit: boolean;
  onCheckFurther: () => void;
}

/** A case at the edge of what was checked: what lies beyond is not known, unless somebody declared that nothing does. */
export function EdgeNote({ ends, worst, capped, mayEdit, onCheckFurther }: EdgeNoteProps) {
  const { colors } = useTheme();
  const { speed } = useUnits();
  const { archived } = useProject();
  const signal = useSignal();
  const [declaring, declare] = useState<EndOfAxis | null>(null);
  const open = ends.filter(({ edge }) => !edge.physical);
  const closed = ends.filter(({ edge }) => edge.physical);
  const names = together(open.map(({ edge }) => endName(edge)));
  const cost = capped
    ? `Meets its target, but is ${names}: capped at tight.`
    : `${sentence(together(open.map((end) => beyondText(end, speed))))} was checked.`;
  const said = [
    open.length > 0 ? `${cost}${archived ? '' : ' Check further, or declare the edge.'}` : '',
    closed.length > 0 ? `Declared: ${together(closed.map((end) => declaredText(end, speed)))}.` : '',
    closed.length > 0 && open.length === 0 && worst ? 'So the verdict is not capped.' : '',
  ];
  return (
    <View role="group" aria-label="At the edge" style={[styles.note, { backgroundColor: colors.bar }]}>
      <Text step="note" tone="ink2">
        <Text step="note" weight={600}>
          {worst ? 'Worst at the edge of what was checked. ' : 'At the edge of what was checked. '}
        </Text>
        {said.filter(Boolean).join(' ')}
      </Text>
      {mayEdit ? (
        <View style={styles.actions}>
          {open.length > 0 ? <Button label="Check further" onPress={onCheckFurther} /> : null}
          {ends.map((end) => (
            <Button
              key={`${end.edge.axis} ${end.edge.end}`}
              kind={end.edge.physical ? 'quiet' : 'secondary'}
              disabled={!signal}
              label={`${end.edge.physical ? 'Take back' : 'Declare'} ${endName(end.edge)}`}
              onPress={() => declare(end)}
            />
          ))}
        </View>
      ) : null}
      <DeclareDialog end={declaring} onClose={() => declare(null)} />
    </View>
  );
}

const sentence = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

const styles = StyleSheet.create({
  note: { paddingHorizontal: 12, paddingVertical: 8, gap: 8 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: 8 },
});
