import { memo } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { VerdictGlyph } from '@/components/ui/verdict-glyph';
import { cellBar, cellLimit } from '@/figures/cell-ruler';
import { BasisMark } from '../basis-mark';
import type { CaseNumber } from '../model/case-number';
import { cellLook } from './cell-look';

export interface CellFaceProps {
  number: CaseNumber;
  /** The one that is singled out. */
  worst: boolean;
  /** Other cases at the same place. */
  more?: number;
  small?: boolean;
}

/** A word in the place of the number is set smaller, and in a small cell left to the shape. */
const LONG = 6;

/** The number, the shape of its verdict, and at the foot its bar against the limit on the edge ruler's scale. */
export function CellFace({ number, worst, more = 0, small = false }: CellFaceProps) {
  const { colors } = useTheme();
  const { digits, verdict, use, view } = number;
  const look = cellLook(verdict, colors);
  const word = digits.length >= LONG;
  const demanded = verdict !== null && view.result !== null && use !== null;
  return (
    <View style={[styles.face, { backgroundColor: look.ground }]}>
      <View style={[styles.number, small && styles.tightly]}>
        <Text
          step={small ? 'tick' : word ? 'small' : 'h3'}
          weight={worst ? 700 : 600}
          tone={view.outdated ? 'ink3' : 'ink'}
          numberOfLines={1}
          style={!small && !word && styles.large}
        >
          {small && word ? '–' : digits}
        </Text>
        {verdict === null ? null : <VerdictGlyph verdict={verdict} size={small ? 11 : word ? 14 : 18} />}
        {more > 0 && !small ? <Text step="tick" tone="ink2">{`+${more}`}</Text> : null}
      </View>
      {view.kept.basis === 'extrapolated' ? null : (
        <View style={[styles.basis, small && styles.corner]}>
          <BasisMark basis={view.kept.basis} small={small} />
        </View>
      )}
      {demanded ? (
        <>
          <View style={[styles.bar, { width: `${100 * cellBar(use)}%`, backgroundColor: look.bar }, small && styles.lowBar]} />
          <View style={[styles.limit, { left: `${100 * cellLimit}%`, backgroundColor: colors.kerb }, small && styles.lowLimit]} />
        </>
      ) : null}
      {worst ? <View style={[styles.frame, { borderColor: colors.ink }]} /> : null}
    </View>
  );
}

export interface CaseCellProps extends CellFaceProps {
  label: string;
  selected: boolean;
  /** The one stop for Tab in the grid. */
  stop: boolean;
  column: number;
  onOpen: (caseId: string) => void;
  onFocus: () => void;
}

/** A cell of the case grid that opens its case. */
export const CaseCell = memo(function CaseCell({ label, selected, stop, column, onOpen, onFocus, ...face }: CaseCellProps) {
  const { colors } = useTheme();
  return (
    <Pressable
      role={'gridcell' as 'cell'}
      aria-label={label}
      aria-selected={selected}
      aria-colindex={column}
      tabIndex={stop ? 0 : -1}
      onPress={() => onOpen(face.number.view.kept.id)}
      onFocus={onFocus}
      style={[styles.cell, { borderColor: colors.rule }]}
    >
      <CellFace {...face} />
      {selected ? <View style={[styles.chosen, { backgroundColor: colors.ink }]} /> : null}
    </Pressable>
  );
});

const styles = StyleSheet.create({
  cell: { flex: 1, minWidth: 68, height: 50, borderLeftWidth: 1 },
  face: { flex: 1, alignItems: 'center', justifyContent: 'center', overflow: 'hidden' },
  number: { flexDirection: 'row', alignItems: 'center', gap: 5, paddingBottom: 3 },
  tightly: { gap: 2, paddingBottom: 2 },
  large: { fontSize: 20, lineHeight: 22 },
  basis: { position: 'absolute', left: 5, top: 5 },
  corner: { left: 1, top: 1 },
  bar: { position: 'absolute', left: 0, bottom: 0, height: 4 },
  lowBar: { height: 3 },
  limit: { position: 'absolute', bottom: 0, width: 2, height: 8 },
  lowLimit: { height: 6 },
  frame: { position: 'absolute', top: 0, left: 0, right: 0, bottom: 0, borderWidth: 3 },
  chosen: { position: 'absolute', right: 0, top: 0, width: 10, height: 10, borderBottomLeftRadius: 10 },
});
