import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
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

/** The buttons at a dialog's foot, the decision last. */
export function DialogActions({ children }: PropsWithChildren) {
  return <View style={styles.actions}>{children}</View>;
}

const styles = StyleSheet.create({
  box: { borderWidth: line.field, borderRadius: corner, padding: 20, gap: 14 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 12, paddingTop: 4 },
});
