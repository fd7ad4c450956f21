import {
  FrequencySheet,
  type FrequencySheetProps,
  PlaneChart,
  type PlaneChartProps,
  TimeSheet,
  type TimeSheetProps,
} from '@/components/charts';
import { useUnits } from '@/components/ui/units';
import { useShownLoop, useShownResponses } from '../live/use-shown';
import { useDemands, useOtherCurves } from '../over/use-demands';
import type { Standing } from '../live/use-standing';

interface Shown {
  readonly standing: Standing;
  /** false where the chart is out of sight: it then stands as A last rested. */
  readonly moving?: boolean;
}

type Place<Props> = Omit<Props, 'a' | 'b' | 'others' | 'limits' | 'units'> & Shown;

/** The charts of A and B. Each follows the gain by itself; nothing round it is rendered with it. */
export function ShownFrequency({ standing, moving, ...place }: Place<FrequencySheetProps>) {
  const units = useUnits();
  const a = useShownLoop(standing, moving);
  const others = useOtherCurves();
  const limits = useDemands();
  return a && <FrequencySheet {...place} a={a} b={standing.b} others={others} limits={limits} units={units} />;
}

export function ShownPlane({ standing, moving, ...place }: Place<PlaneChartProps>) {
  const units = useUnits();
  const a = useShownLoop(standing, moving);
  const others = useOtherCurves();
  const limits = useDemands();
  return a && <PlaneChart {...place} a={a} b={standing.b} others={others} limits={limits} units={units} />;
}

export function ShownTime({ standing, moving, ...place }: Place<TimeSheetProps>) {
  const units = useUnits();
  const a = useShownResponses(standing, moving);
  const limits = useDemands();
  return a && <TimeSheet {...place} a={a} b={standing.b} limits={limits} units={units} />;
}
