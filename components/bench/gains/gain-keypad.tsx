import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { ModalFrame } from '@/components/ui/modal-frame';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { corner, line } from '@/components/ui/tokens';
import { type Gain, gainWords, isTime } from '../draft/gain';
import { type Entry, entryOf, type KeypadKey, keypadKeyOf, pressed } from './keypad-entry';
import { readGain } from './read-gain';
import type { GainControl } from './use-gain';

interface GainKeypadProps {
  gain: Gain;
  control: GainControl;
  open: boolean;
  onClose: () => void;
}

const rows: readonly (readonly KeypadKey[])[] = [
  ['1', '2', '3'],
  ['4', '5', '6'],
  ['7', '8', '9'],
  ['.', '0', 'erase'],
];

/** Enters a gain with the thumb that holds the phone, or from a keyboard; nothing moves until it is set. */
export function GainKeypad({ open, onClose, ...rest }: GainKeypadProps) {
  const { label } = gainWords(rest.gain, rest.control.form);
  return (
    <ModalFrame open={open} label={`Enter ${label}`} onClose={onClose} place="sheet">
      <KeypadBody {...rest} onClose={onClose} />
    </ModalFrame>
  );
}

function KeypadBody({ gain, control, onClose }: Omit<GainKeypadProps, 'open'>) {
  const { colors } = useTheme();
  const [entry, setEntry] = useState<Entry>(() => entryOf(control.value));
  const press = (key: KeypadKey) => setEntry((before) => pressed(before, key));
  const { form, unit } = control;
  const read = readGain(gain, form, entry.text);
  const { label, name } = gainWords(gain, form);
  const set = () => {
    if ('problem' in read) return;
    control.set(read.value);
    onClose();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const key = keypadKeyOf(event.key);
    if (key !== null) press(key);
    else if (event.key !== 'Enter' || (event.target as HTMLElement).closest('button')) return;
    else set();
    event.preventDefault();
  };
  return (
    <View style={[styles.sheet, { backgroundColor: colors.paper, borderTopColor: colors.ink }]} onKeyDown={onKeyDown}>
      <View style={styles.reading} role="status">
        <Text tone="ink2">{label}</Text>
        <Text step="big" style={styles.number}>
          {entry.text || ' '}
        </Text>
        <View style={[styles.caret, { backgroundColor: colors.ink }]} />
        <Text tone="ink2">{unit}</Text>
      </View>
      <Text step="note" tone={'problem' in read ? 'fail' : 'ink2'}>
        {'problem' in read ? read.problem : `${name}, the other gains as they are.`}
      </Text>
      {rows.map((row) => (
        <View key={row.join()} style={styles.row}>
          {row.map((key) => (
            <Key key={key} name={key} onPress={() => press(key)} />
          ))}
        </View>
      ))}
      <View style={styles.row}>
        {!isTime(gain, form) && (
          <View style={styles.sign}>
            <Key name="sign" onPress={() => press('sign')} />
          </View>
        )}
        <Button label="Cancel" tall onPress={onClose} />
        <View style={styles.decision}>
          <Button kind="primary" tall stretch label={`Set ${label} to ${entry.text || '–'}`} disabled={'problem' in read} onPress={set} />
        </View>
      </View>
    </View>
  );
}

const keyLabels: Partial<Record<KeypadKey, string>> = { '.': 'Decimal point', erase: 'Erase', sign: 'Change the sign' };

function Key({ name, onPress }: { name: KeypadKey; onPress: () => void }) {
  const { colors } = useTheme();
  return (
    <Pressable
      role="button"
      aria-label={keyLabels[name] ?? name}
      onPress={onPress}
      style={({ pressed: down }) => [styles.key, { borderColor: colors.rule2, backgroundColor: down ? colors.bar : colors.paper }]}
    >
      {name === 'erase' ? <Icon name="erase" size={26} /> : <Text style={styles.digit}>{name === 'sign' ? '±' : name}</Text>}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  sheet: { borderTopWidth: line.head, paddingHorizontal: 12, paddingTop: 10, paddingBottom: 12, gap: 6 },
  reading: { flexDirection: 'row', alignItems: 'baseline', gap: 8, minHeight: 40 },
  number: { fontSize: 34, lineHeight: 38 },
  caret: { width: 2, height: 30, marginLeft: -5, alignSelf: 'center' },
  row: { flexDirection: 'row', gap: 6 },
  sign: { width: 52 },
  decision: { flex: 1 },
  key: { flex: 1, height: 52, borderWidth: line.field, borderRadius: corner, alignItems: 'center', justifyContent: 'center' },
  digit: { fontSize: 24, lineHeight: 28 },
});
