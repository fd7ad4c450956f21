import { EdgeRuler } from '@/components/charts/edge-ruler';
import { useUnits } from '@/components/ui/units';
import { demandedText, quantityName } from '@/figures/quantity-text';
import { checkValueText, demandText } from './demand-text';
import type { WorstCheck } from './worst-checks';

/** All cases against the headline's limit and target, both named: the phone's one ruler. */
export function HeadlineRuler({ worst: { check, uses, case: where } }: { worst: WorstCheck }) {
  const units = useUnits();
  const { quantity, limit, target, use } = check;
  const names = {
    limit: `limit ${demandedText(quantity, limit, units)}`,
    target: target === null ? undefined : `target ${demandedText(quantity, target, units)}`,
  };
  const said = `${quantityName(quantity)} of ${uses.length} cases, ${demandText(check, units)}. Worst ${checkValueText(check, units)} in ${where.name}.`;
  return <EdgeRuler uses={uses} worst={use} hasTarget={target !== null} label={said} names={names} />;
}
