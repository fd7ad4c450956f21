import { memo, type ReactNode, useCallback, useState } from 'react';
import { type LayoutChangeEvent, Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { touch } from '@/components/ui/tokens';
import { DataTable, type TableContent } from './data-table';
import { useFocusRing } from './use-focus-ring';

export interface ChartShellProps {
  /** What a reader who cannot see the picture should know of it. */
  description: string;
  /** Names the chart on its table's button. */
  name: string;
  height: number;
  onLayout?: (event: LayoutChangeEvent) => void;
  picture: ReactNode;
  /** Cursor and pointer layer, above the picture. */
  overlay: ReactNode;
  /** Made only when the table is asked for. */
  table: () => TableContent;
  /** Stands left of the table's button. */
  tools?: ReactNode;
}

interface TableButtonProps {
  name: string;
  open: boolean;
  besideTools: boolean;
  onPress: () => void;
}

const TableButton = memo(function TableButton({ name, open, besideTools, onPress }: TableButtonProps) {
  const { style, ...focus } = useFocusRing();
  return (
    <Pressable
      role="button"
      aria-label={`${open ? 'Curves' : 'Table'} of ${name}`}
      onPress={onPress}
      style={[styles.button, besideTools && styles.middle, style]}
      {...focus}
    >
      <Text step="tick" tone="ink3">
        {open ? 'Curves' : 'Table'}
      </Text>
    </Pressable>
  );
});

/** What every chart has round its picture: a description, a cursor over it, and the same numbers as a table in its place. */
export function ChartShell({ description, name, height, onLayout, picture, overlay, table, tools }: ChartShellProps) {
  const [open, setOpen] = useState(false);
  const toggle = useCallback(() => setOpen((before) => !before), []);
  return (
    <View onLayout={onLayout} style={{ height }}>
      {open ? (
        <View style={styles.table}>
          <DataTable table={table()} height={height - touch} />
        </View>
      ) : (
        <>
          <View role="img" aria-label={description} style={StyleSheet.absoluteFill}>
            {picture}
          </View>
          {overlay}
        </>
      )}
      <View style={styles.tools}>
        {open ? null : tools}
        <TableButton name={name} open={open} besideTools={tools !== undefined} onPress={toggle} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  table: { paddingTop: touch },
  tools: { position: 'absolute', top: 0, right: 0, flexDirection: 'row' },
  middle: { justifyContent: 'center' },
  button: { minWidth: touch, minHeight: touch, paddingRight: 10, paddingTop: 2, alignItems: 'flex-end' },
});
