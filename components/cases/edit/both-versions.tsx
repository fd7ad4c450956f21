import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { PlantRevision } from '@/contract';
import { axisName, axisUnit, caseAxes } from '@/figures/axis-text';
import { withUnit } from '@/figures/format';
import { basisWords } from '../basis-words';
import type { CaseForm } from './case-form';
import { parameterWords } from './parameter-words';

/** A case field by field, in words. */
function linesOf(form: CaseForm, plants: readonly PlantRevision[]): Map<string, string> {
  const plant = plants.find(({ id }) => id === form.plantId)?.name ?? '–';
  const filled = (text: string | undefined, unit = '') => (text?.trim() ? withUnit(text.trim(), unit) : '–');
  return new Map([
    ['Name', form.name],
    ['Plant', `${plant}, ${form.plantRevision.trim() === '' ? 'the latest' : `rev ${form.plantRevision}`}`],
    ...caseAxes.map((axis) => [axisName(axis), filled(form[axis], axisUnit(axis, form.speedUnit))] as const),
    ...Object.keys(form.parameters).map(
      (name) => [parameterWords(name).label, filled(form.parameters[name], parameterWords(name).unit)] as const,
    ),
    ['Known', basisWords[form.basis].tag],
  ]);
}

export interface Difference {
  readonly name: string;
  readonly mine: string;
  readonly theirs: string;
}

/** The fields in which two versions of a case differ. */
export function differences(mine: CaseForm, theirs: CaseForm, plants: readonly PlantRevision[]): Difference[] {
  const [left, right] = [linesOf(mine, plants), linesOf(theirs, plants)];
  const names = [...new Set([...left.keys(), ...right.keys()])];
  return names
    .map((name) => ({ name, mine: left.get(name) ?? '–', theirs: right.get(name) ?? '–' }))
    .filter((line) => line.mine !== line.theirs);
}

interface BothVersionsProps {
  mine: CaseForm;
  theirs: CaseForm;
  plants: readonly PlantRevision[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Someone else kept a change of this case meanwhile: both versions beside each other, and the two ways on. */
export function BothVersions({ mine, theirs, plants, onKeepMine, onTakeTheirs }: BothVersionsProps) {
  const { colors } = useTheme();
  const lines = differences(mine, theirs, plants);
  return (
    <View role="alert" style={[styles.box, { backgroundColor: colors.bar }]}>
      <Text step="note" tone="ink2">
        <Text step="note" weight={600}>
          Someone changed this case meanwhile.{' '}
        </Text>
        {lines.length === 0 ? 'It says the same as yours.' : 'What you typed is still here.'}
      </Text>
      {lines.length > 0 ? (
        <View role="table" aria-label="Both versions">
          <View role="row" style={styles.row}>
            {['', 'yours', 'theirs'].map((name) => (
              <View key={name} role={name ? 'columnheader' : 'cell'} style={styles.cell}>
                <Text step="small" tone="ink2">
                  {name}
                </Text>
              </View>
            ))}
          </View>
          {lines.map(({ name, mine: left, theirs: right }) => (
            <View key={name} role="row" style={styles.row}>
              <View role="rowheader" style={styles.cell}>
                <Text step="note">{name}</Text>
              </View>
              {[left, right].map((text, i) => (
                <View key={i} role="cell" style={styles.cell}>
                  <Text step="note" weight={600}>
                    {text}
                  </Text>
                </View>
              ))}
            </View>
          ))}
        </View>
      ) : null}
      <View style={styles.actions}>
        <Button label="Put mine over theirs" onPress={onKeepMine} />
        <Button kind="quiet" label="Take theirs" onPress={onTakeTheirs} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { padding: 12, gap: 8 },
  row: { flexDirection: 'row', gap: 8, paddingVertical: 3 },
  cell: { flex: 1, minWidth: 0 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: 8 },
});
