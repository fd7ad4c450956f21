import { ReadOut, type ReadOutProps, type TimePanel, TimeReadOut } from '@/components/charts';
import { useUnits } from '@/components/ui/units';
import { useReadLoop, useReadResponses } from '../live/use-shown';
import type { Standing } from '../live/use-standing';

/** What A and B are at the frequency of the cursor. */
export function ShownReadOut({ standing, layout }: { standing: Standing } & Pick<ReadOutProps, 'layout'>) {
  const units = useUnits();
  const a = useReadLoop();
  return a && <ReadOut a={a} b={standing.b} units={units} layout={layout} />;
}

/** What the responses of A and B are at the time of the time cursor. */
export function ShownTimeReadOut({ standing, panels }: { standing: Standing; panels: readonly TimePanel[] }) {
  const a = useReadResponses(standing);
  return a && <TimeReadOut a={a} b={standing.b} layout="line" panels={panels} />;
}
