import { type ReactNode, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { LapChart } from '@/components/charts';
import { CasesOrLimits } from '@/components/navigation/cases-or-limits';
import { useProject } from '@/components/navigation/project-context';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { edgeWords } from '@/components/verdict/edge-words';
import { type CasesLink, type CasesView, viewIn } from './cases-link';
import { CaseGrid } from './grid/case-grid';
import { CaseList } from './list/case-list';
import { lapProps } from './lap-props';
import { QuantityTabs } from './numbers/quantity-tabs';
import type { CaseData } from './use-case-data';
import type { useShownCases } from './use-shown-cases';

type Shown = ReturnType<typeof useShownCases>;

export interface CaseViewsProps {
  data: CaseData;
  shown: Shown;
  link: CasesLink;
  onChange: (change: { case?: string; number?: string; view?: string }) => void;
  /** At the right of the ways to look, where there is room. */
  tools: ReactNode;
}

const CHART_HEIGHT = { phone: 380, middle: 380, wide: 366 };

/** The cases themselves: as a grid, as a list, and as one number over speed. */
export function CaseViews({ data: { views, analysis }, shown, link, onChange, tools }: CaseViewsProps) {
  const layout = useLayout();
  const wide = layout === 'wide';
  const { quantity, quantities, layout: grid, numbers, worst, selected } = shown;
  const chartable = grid !== null && grid.columns.length > 1;
  const asked = grid === null ? 'list' : viewIn(link);
  const view = asked === 'chart' && (wide || !chartable) ? 'grid' : asked;
  const options: { value: CasesView; label: string }[] = [
    { value: 'grid', label: wide && chartable ? 'Grid and chart' : 'Grid' },
    { value: 'list', label: 'List' },
    ...(chartable && !wide ? [{ value: 'chart' as const, label: 'Chart' }] : []),
  ];
  const open = (caseId: string) => onChange({ case: caseId });
  const columns = useMemo(
    () => [...new Set((analysis?.inputs.limits ?? []).map((limit) => limit.quantity).concat(quantity))],
    [analysis, quantity],
  );
  const padding = layout === 'phone' ? styles.phone : styles.wide;
  return (
    <View>
      <View style={[styles.head, layout === 'phone' ? null : padding]}>
        {view === 'list' ? (
          <View style={styles.grow} />
        ) : (
          <QuantityTabs quantities={quantities} current={quantity} onChange={(number) => onChange({ number })} />
        )}
        {layout === 'phone' ? null : <CasesOrLimits current="cases" />}
      </View>
      <View style={[padding, layout === 'phone' ? null : styles.ways]}>
        {grid === null ? null : (
          <Segments
            label="Cases shown as"
            value={view}
            options={options}
            onChange={(next) => onChange({ view: next })}
            stretch={layout === 'phone'}
          />
        )}
        {tools}
      </View>
      {view === 'list' || grid === null ? (
        <View style={layout === 'phone' ? null : padding}>
          <CaseList views={views} columns={columns} worst={worst?.view.kept.id} selected={selected.kept.id} onOpen={open} />
        </View>
      ) : (
        <View style={layout === 'phone' ? null : padding}>
          {view === 'grid' ? (
            <CaseGrid layout={grid} quantity={quantity} numbers={numbers} worst={worst} selected={selected.kept.id} onOpen={open} />
          ) : null}
          {chartable && (wide || view === 'chart') ? (
            <Chart shown={shown} layout={grid} limits={analysis?.inputs.limits ?? []} height={CHART_HEIGHT[layout]} />
          ) : null}
          {grid.off.length > 0 ? (
            <View style={styles.off}>
              <Text step="note" tone="ink2" style={layout === 'phone' && styles.phone}>
                Without a place in the grid:
              </Text>
              <CaseList views={grid.off} columns={columns} worst={worst?.view.kept.id} selected={selected.kept.id} onOpen={open} />
            </View>
          ) : null}
        </View>
      )}
    </View>
  );
}

interface ChartProps {
  shown: Shown;
  layout: NonNullable<Shown['layout']>;
  limits: Parameters<typeof lapProps>[0]['limits'];
  height: number;
}

function Chart({ shown: { quantity, numbers, worst, headline }, layout, limits, height }: ChartProps) {
  const units = useUnits();
  const { operatingRange } = useProject();
  const props = useMemo(() => {
    const first = headline !== null && worst?.view.kept.id === headline.case?.id && headline.quantity === quantity;
    const aside = first ? edgeWords(headline) : null;
    return lapProps({ layout, quantity, numbers, worst, limits, operatingRange, units, aside });
  }, [layout, quantity, numbers, worst, limits, operatingRange, units, headline]);
  return (
    <View style={styles.chart}>
      <LapChart {...props} height={height} />
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', alignItems: 'flex-end', gap: 16, zIndex: 12 },
  grow: { flexGrow: 1 },
  ways: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', alignItems: 'center', gap: 10 },
  phone: { paddingHorizontal: gutter.phone, paddingVertical: 8 },
  wide: { paddingHorizontal: gutter.wide, paddingTop: 12 },
  chart: { paddingTop: 18 },
  off: { paddingTop: 16, gap: 4 },
});
