import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { NumberField } from '@/components/ui/number-field';
import { Segments } from '@/components/ui/segments';
import { Sheet } from '@/components/ui/sheet';
import { Heading, Text } from '@/components/ui/text';
import { useBench, useDraft, useSettings } from '../bench-context';
import type { Compared } from '../compare/use-compared';
import type { Settings } from '../draft/settings';
import type { BenchLink, ChangeLink } from '../subject/bench-link';
import { CompareChoice } from './compare-choice';
import { KeyList } from './key-list';
import { StepFields } from './step-fields';

interface SettingsSheetProps {
  open: boolean;
  onClose: () => void;
  link: BenchLink;
  onLink: ChangeLink;
  compared: Compared;
}

const samplingOptions = [
  { value: 'unsaid', label: 'Nobody said' },
  { value: 'continuous', label: 'Continuous, stated' },
] as const;

const within = (most: number) => (value: number) => (Math.abs(value) <= most ? null : `Between ${-most} and ${most}.`);

/** Everything of the design and of how it is looked at that has no rule of its own, and the keys of the bench. */
export function SettingsSheet({ open, onClose, link, onLink, compared }: SettingsSheetProps) {
  const { store, subject } = useBench();
  const settings = useSettings();
  const note = useDraft((draft) => draft.note);
  const sampling = subject.opened?.sampling;
  const period = sampling !== null && typeof sampling === 'object' ? sampling.period : null;
  const move = (patch: Partial<Settings>) => store.getState().move(patch);
  const hold = (patch: Partial<Settings>) => store.getState().hold(patch);
  const release = () => store.getState().release();
  const close = () => {
    release();
    onClose();
  };
  return (
    <Sheet open={open} label="All settings" onClose={close}>
      <View style={styles.content}>
        <Heading level={2}>All settings</Heading>
        <Text step="note" tone="ink2">
          Form: parallel, Kp + Ki/s + Kd·s/(1 + s·Tf). Tf acts on the derivative alone.
        </Text>
        <View style={styles.row}>
          <View style={styles.cell}>
            <NumberField
              label="Weight b, proportional"
              value={settings.proportionalWeight}
              refuse={within(10)}
              onChangeNumber={(proportionalWeight) => hold({ proportionalWeight })}
              onBlur={release}
            />
          </View>
          <View style={styles.cell}>
            <NumberField
              label="Weight c, derivative"
              value={settings.derivativeWeight}
              refuse={within(10)}
              onChangeNumber={(derivativeWeight) => hold({ derivativeWeight })}
              onBlur={release}
            />
          </View>
          <View style={styles.cell}>
            <NumberField
              label="Feedforward"
              unit="command per reference"
              value={settings.feedforward}
              refuse={within(1e12)}
              onChangeNumber={(feedforward) => hold({ feedforward })}
              onBlur={release}
            />
          </View>
        </View>
        {period === null ? (
          <View style={styles.group}>
            <Text weight={600}>How the unit samples</Text>
            <Segments
              label="How the unit samples"
              value={settings.statedContinuous ? 'continuous' : 'unsaid'}
              options={samplingOptions}
              onChange={(value) => move({ statedContinuous: value === 'continuous' })}
            />
            <Text step="small" tone="ink2">
              Without a statement nothing is judged: what nobody said cannot be signed.
            </Text>
          </View>
        ) : (
          <Text step="note" tone="ink2">{`Sampled, ${period} s.`}</Text>
        )}
        <StepFields link={link} onLink={onLink} />
        <CompareChoice compared={compared} onLink={onLink} />
        <Field label="Note to this revision" value={note} maxLength={2000} onChangeText={(text) => store.getState().setNote(text)} />
        <KeyList />
      </View>
    </Sheet>
  );
}

const styles = StyleSheet.create({
  content: { gap: 16, paddingTop: 16, paddingBottom: 12, maxWidth: 900, width: '100%', alignSelf: 'center' },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12 },
  cell: { flexGrow: 1, flexBasis: 180 },
  group: { gap: 6 },
});
