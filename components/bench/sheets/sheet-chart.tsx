import { memo, useMemo } from 'react';
import { View } from 'react-native';
import { timePanels } from '@/components/charts/time-panels';
import type { FrequencyPanel } from '@/components/charts';
import { useBench } from '../bench-context';
import type { StepSizes } from '../live/bench-loop';
import type { Standing } from '../live/use-standing';
import { BudgetLine } from '../strip/budget-line';
import type { ChartSheet } from './chart-sheet';
import { ShownFrequency, ShownPlane, ShownTime } from './shown-charts';

interface SheetChartProps {
  sheet: ChartSheet;
  /** Whether this is the sheet that is looked at. */
  moving: boolean;
  standing: Standing;
  steps: StepSizes;
  height: number;
}

const bode: readonly FrequencyPanel[] = ['magnitude', 'phase'];
const sensitivity: readonly FrequencyPanel[] = ['sensitivity'];
const BUDGET_HEIGHT = 42;

/** The chart of one sheet on a phone. */
export const SheetChart = memo(function SheetChart({ sheet, steps, ...shown }: SheetChartProps) {
  const plantUnits = useBench().subject.plant.units;
  const panels = useMemo(() => timePanels(plantUnits, steps), [plantUnits, steps]);
  const stepPanels = useMemo(() => [panels.reference, panels.control], [panels]);
  const loadPanels = useMemo(() => [panels.load], [panels]);
  const { ends } = shown.standing;
  switch (sheet) {
    case 'bode':
      return (
        <>
          <ShownFrequency {...shown} height={shown.height - BUDGET_HEIGHT} panels={bode} />
          <View style={{ paddingHorizontal: 12, height: BUDGET_HEIGHT }}>
            <BudgetLine compact />
          </View>
        </>
      );
    case 'nyquist':
      return <ShownPlane {...shown} />;
    case 'sensitivity':
      return <ShownFrequency {...shown} panels={sensitivity} />;
    case 'step':
      return <ShownTime {...shown} panels={stepPanels} end={ends?.reference} />;
    case 'load':
      return <ShownTime {...shown} panels={loadPanels} end={ends?.load} />;
  }
});
