import { createContext, type PropsWithChildren, useContext } from 'react';
import { StyleSheet, View } from 'react-native';
import { useTheme } from './theme';
import { gutter } from './tokens';
import { useLayout } from './use-layout';

const InRow = createContext(false);

/** Columns of one sheet, parted by hairlines; on a phone they follow each other. */
export function Columns({ children }: PropsWithChildren) {
  const row = useLayout() !== 'phone';
  return (
    <InRow.Provider value={row}>
      <View style={row ? styles.row : null}>{children}</View>
    </InRow.Provider>
  );
}

export interface ColumnProps {
  /** Pixels, padding included; the column takes what the others leave where absent. */
  width?: number;
  /** The last one has no line at its right. */
  last?: boolean;
}

export function Column({ width, last = false, children }: PropsWithChildren<ColumnProps>) {
  const { colors } = useTheme();
  const row = useContext(InRow);
  const place = width === undefined ? styles.rest : { width };
  const line = { borderRightWidth: last ? 0 : 1, borderRightColor: colors.rule };
  return <View style={[styles.column, row ? [place, line] : styles.phone]}>{children}</View>;
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexGrow: 1 },
  column: { padding: gutter.wide, gap: 26, minWidth: 0 },
  rest: { flex: 1 },
  phone: { padding: gutter.phone, gap: 20 },
});
