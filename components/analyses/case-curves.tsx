import { StyleSheet, View } from 'react-native';
import { type ChartDesign, type ChartLimits, CursorProvider, FrequencySheet, PlaneChart, ReadOut, TimeSheet } from '@/components/charts';
import { Paper } from '@/components/ui/paper';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';

const panels = [
  { kind: 'reference', title: 'Output after a reference step of 1', unit: '' },
  { kind: 'load', title: 'Output after a load step of 1 at the command', unit: '' },
  { kind: 'control', title: 'Control for the reference step', unit: '' },
] as const;

/** All curves of one case, one cursor through them. */
export function CaseCurves({ design, limits }: { design: ChartDesign; limits: ChartLimits }) {
  const units = useUnits();
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
