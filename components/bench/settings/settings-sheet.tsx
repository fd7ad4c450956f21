import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { Sheet } from '@/components/ui/sheet';
import { Heading } from '@/components/ui/text';
import { useBench, useDraft } from '../bench-context';
import type { Compared } from '../compare/use-compared';
import type { BenchLink, ChangeLink } from '../subject/bench-link';
import { CompareChoice } from './compare-choice';
import { FilterList } from './filter-list';
import { FormChoice } from './form-choice';
import { KeyList } from './key-list';
import { SamplingChoice } from './sampling-choice';
import { StepFields } from './step-fields';
import { WeightFields } from './weight-fields';

interface SettingsSheetProps {
  open: boolean;
  onClose: () => void;
  link: BenchLink;
  onLink: ChangeLink;
  compared: Compared;
}

/** Everything of the design and of how it is looked at that has no rule of its own, and the keys of the bench. */
export function SettingsSheet({ open, onClose, link, onLink, compared }: SettingsSheetProps) {
  const { store } = useBench();
  const note = useDraft((draft) => draft.note);
  const close = () => {
    store.getState().release();
    onClose();
  };
  return (
    <Sheet open={open} label="All settings" onClose={close}>
      <View style={styles.content}>
        <Heading level={2}>All settings</Heading>
        <FormChoice />
        <WeightFields />
        <FilterList />
        <SamplingChoice />
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
});
