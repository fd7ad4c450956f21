import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { useBench, useDraft, useReading } from '../bench-context';
import { current } from '../draft/draft';
import { budgetWords, samplingWords } from './budget-words';

/** One line about what delays cost at the crossover, and how the loop is sampled. */
export function BudgetLine({ compact = false }: { compact?: boolean }) {
  const units = useUnits();
  const { opened } = useBench().subject;
  const statedContinuous = useDraft((draft) => current(draft).statedContinuous);
  const { input, output } = useReading();
  const budget = input && output ? budgetWords(input.loop, output.analysis, units) : null;
  const sampling = opened?.sampling;
  const period = sampling !== null && typeof sampling === 'object' ? sampling.period : null;
  const step = compact ? 'small' : 'note';
  return (
    <Text step={step} tone="ink2" style={{ flexShrink: 1 }}>
      {budget && (
        <>
          <Text step={step} weight={600}>
            {budget.lead}
          </Text>{' '}
          {budget.text}.{' '}
        </>
      )}
      Loop: {samplingWords(statedContinuous, period)}.
    </Text>
  );
}
