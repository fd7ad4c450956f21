import { filterPhaseDegrees } from '@/analysis';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import type { Filter } from '@/contract';
import { formatDegrees, formatFrequency, withUnit } from '@/figures';
import { useReading } from '../bench-context';

/** How much a filter turns the loop at its crossover; nothing where there is none. */
export function FilterPhase({ filter }: { filter: Filter }) {
  const unit = useUnits().frequency;
  const frequency = useReading().output?.analysis.margins.phase?.frequency;
  if (frequency === undefined) return null;
  const phase = formatDegrees(filterPhaseDegrees(filter, frequency));
  return (
    <Text step="note" tone="ink2">
      {`${phase}° at the crossover, ${withUnit(formatFrequency(frequency, unit), unit)}`}
    </Text>
  );
}
