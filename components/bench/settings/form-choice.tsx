import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useAnnounce } from '@/components/ui/announcements';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import { useBench, useSettings, useWarnings } from '../bench-context';
import { current } from '../draft/draft';
import { formEquations, formNames, forms, switchedTo } from '../draft/form';
import type { Form } from '../draft/settings';
import { IntegralChoice } from './integral-choice';
import { OtherForms } from './other-forms';

const options = forms.map((form) => ({ value: form, label: formNames[form] }));

const aboutTf: Readonly<Record<Form, string>> = {
  parallel: 'Tf acts on the derivative alone.',
  ideal: 'Tf acts on the derivative alone.',
  series: 'Tf filters the whole controller. Weights b and c act on the converted parallel gains.',
};

/** In which form the controller is written. A switch changes no margin; a form that cannot say this controller is refused. */
export function FormChoice() {
  const { store } = useBench();
  const announce = useAnnounce();
  const settings = useSettings();
  const negative = useWarnings().find(({ code }) => code === 'negativeConvertedGain');
  const [refused, setRefused] = useState<{ readonly of: typeof settings; readonly words: string } | null>(null);
  const choose = (form: Form) => {
    const draft = store.getState();
    const written = switchedTo(form, current(draft), draft.base.settings);
    if ('gains' in written) return draft.move(written.gains);
    const words = `${formNames[form]} form cannot say this controller. ${written.refusal}`;
    setRefused({ of: settings, words });
    announce(words);
  };
  return (
    <View style={styles.group}>
      <Text weight={600}>Form</Text>
      <Segments label="Form" value={settings.form} options={options} onChange={choose} />
      {refused?.of === settings && (
        <Text step="note" tone="fail">
          {refused.words}
        </Text>
      )}
      <Text step="note" tone="ink2">{`${formEquations[settings.form]}. ${aboutTf[settings.form]}`}</Text>
      {negative && (
        <Text step="note" weight={600}>
          {negative.message}
        </Text>
      )}
      <IntegralChoice />
      <OtherForms />
    </View>
  );
}

const styles = StyleSheet.create({ group: { gap: 8 } });
