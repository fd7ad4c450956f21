import type { PropsWithChildren } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { Button } from './button';
import { ModalFrame } from './modal-frame';
import { useTheme } from './theme';
import { gutter, line } from './tokens';

export interface SheetProps {
  open: boolean;
  label: string;
  onClose: () => void;
}

/** A sheet from the foot of the page, in reach of a thumb, with its Close at the very foot. */
export function Sheet({ open, label, onClose, children }: PropsWithChildren<SheetProps>) {
  const { colors } = useTheme();
  return (
    <ModalFrame open={open} label={label} onClose={onClose} place="sheet">
      <View style={[styles.sheet, { backgroundColor: colors.paper, borderTopColor: colors.ink }]}>
        <ScrollView style={styles.content}>{children}</ScrollView>
        <Button label="Close" onPress={onClose} stretch tall />
      </View>
    </ModalFrame>
  );
}

const styles = StyleSheet.create({
  sheet: { borderTopWidth: line.head, paddingHorizontal: gutter.phone, paddingBottom: 12, maxHeight: '85dvh' as unknown as number },
  content: { flexShrink: 1, marginBottom: 8 },
});
