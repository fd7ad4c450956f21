import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from './button';
import { ModalFrame } from './modal-frame';
import { Heading } from './text';
import { useTheme } from './theme';
import { corner, line } from './tokens';

export interface DialogProps {
  open: boolean;
  title: string;
  onClose: () => void;
}

/** A question that holds the page: for what cannot be taken back, and for making something new. */
export function Dialog({ open, title, onClose, children }: PropsWithChildren<DialogProps>) {
  const { colors } = useTheme();
  return (
    <ModalFrame open={open} label={title} onClose={onClose} place="dialog">
      <View style={[styles.box, { backgroundColor: colors.paper, borderColor: colors.ink }]}>
        <Heading level={2}>{title}</Heading>
        {children}
      </View>
    </ModalFrame>
  );
}

export interface DialogDecisionProps {
  /** What is decided, as a command: "Change the name". */
  label: string;
  busyLabel?: string;
  busy?: boolean;
  onDecide: () => void;
  onClose: () => void;
}

/** The two buttons at a dialog's foot, the decision last. */
export function DialogDecision({ onDecide, onClose, ...decision }: DialogDecisionProps) {
  return (
    <View style={styles.actions}>
      <Button label="Not yet" onPress={onClose} />
      <Button kind="primary" onPress={onDecide} {...decision} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderWidth: line.field, borderRadius: corner, padding: 20, gap: 14 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 12, paddingTop: 4 },
});
