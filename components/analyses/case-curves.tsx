import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { type ChartDesign, type ChartLimits, CursorProvider, FrequencySheet, PlaneChart, ReadOut, TimeSheet } from '@/components/charts';
import { timePanels } from '@/components/charts/time-panels';
import { Paper } from '@/components/ui/paper';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import type { KeptPlant } from '@/contract';

/** An analysis is kept with responses to steps of one. */
const UNIT_STEPS = { reference: 1, load: 1 };

interface CaseCurvesProps {
  design: ChartDesign;
  limits: ChartLimits;
  plantUnits: KeptPlant['units'];
}

/** All curves of one case, one cursor through them. */
export function CaseCurves({ design, limits, plantUnits }: CaseCurvesProps) {
  const units = useUnits();
  const { reference, load, control } = useMemo(() => timePanels(plantUnits, UNIT_STEPS), [plantUnits]);
  const panels = useMemo(() => [reference, load, control], [reference, load, control]);
  const phone = useLayout() === 'phone';
  const sheet = phone ? undefined : styles.sheet;
  return (
    <CursorProvider>
      <View style={phone ? styles.stack : styles.side}>
        <Paper style={sheet}>
          <FrequencySheet a={design} limits={limits} units={units} height={480} />
        </Paper>
        <Paper style={sheet}>
          <PlaneChart a={design} limits={limits} units={units} height={420} />
          <ReadOut a={design} units={units} layout={phone ? 'line' : 'table'} />
        </Paper>
        {design.analysis.timeResponse?.reference ? (
          <Paper style={sheet}>
            <TimeSheet a={design} limits={limits} units={units} panels={panels} height={480} />
          </Paper>
        ) : null}
      </View>
    </CursorProvider>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', flexWrap: 'wrap', gap: 14 },
  stack: { gap: 8 },
  sheet: { flexGrow: 1, flexBasis: 360, minWidth: 0 },
});
