import { memo, useMemo } from 'react';
import { View } from 'react-native';
import { type ChartDesign, type FrequencyPanel, FrequencySheet, PlaneChart, TimeSheet } from '@/components/charts';
import { useUnits } from '@/components/ui/units';
import { useBench } from '../bench-context';
import type { StepSizes } from '../live/bench-loop';
import type { TimeEnds } from '../live/time-ends';
import { BudgetLine } from '../strip/budget-line';
import type { ChartSheet } from './chart-sheet';
import { timePanels } from './time-panels';

interface SheetChartProps {
  sheet: ChartSheet;
  a: ChartDesign;
  b: ChartDesign | undefined;
  steps: StepSizes;
  height: number;
  ends: TimeEnds | undefined;
}

const bode: readonly FrequencyPanel[] = ['magnitude', 'phase'];
const sensitivity: readonly FrequencyPanel[] = ['sensitivity'];
const BUDGET_HEIGHT = 42;

/** The chart of one sheet on a phone. */
export const SheetChart = memo(function SheetChart({ sheet, a, b, steps, height, ends }: SheetChartProps) {
  const units = useUnits();
  const plantUnits = useBench().subject.plant.units;
  const panels = useMemo(() => timePanels(plantUnits, steps), [plantUnits, steps]);
  const stepPanels = useMemo(() => [panels.reference, panels.control], [panels]);
  const loadPanels = useMemo(() => [panels.load], [panels]);
  const scene = { a, b, units, height };
  switch (sheet) {
    case 'bode':
      return (
        <>
          <FrequencySheet {...scene} height={height - BUDGET_HEIGHT} panels={bode} />
          <View style={{ paddingHorizontal: 12, height: BUDGET_HEIGHT }}>
            <BudgetLine compact />
          </View>
        </>
      );
    case 'nyquist':
      return <PlaneChart {...scene} />;
    case 'sensitivity':
      return <FrequencySheet {...scene} panels={sensitivity} />;
    case 'step':
      return <TimeSheet {...scene} panels={stepPanels} end={ends?.reference} />;
    case 'load':
      return <TimeSheet {...scene} panels={loadPanels} end={ends?.load} />;
  }
});
