import { EdgeRuler } from '@/components/charts/edge-ruler';
import { useUnits } from '@/components/ui/units';
import { quantityName, quantityText } from '@/figures/quantity-text';
import { checkValueText, demandText } from './demand-text';
import type { WorstCheck } from './worst-checks';

/** All cases against the headline's limit and target, both named: the phone's one ruler. */
export function HeadlineRuler({ worst: { check, uses, case: where } }: { worst: WorstCheck }) {
  const units = useUnits();
  const { quantity, limit, target, use } = check;
  const names = {
    limit: `limit ${quantityText(quantity, limit, units).text}`,
    target: target === null ? undefined : `target ${quantityText(quantity, target, units).text}`,
  };
  const said = `${quantityName(quantity)} of ${uses.length} cases, ${demandText(check, units)}. Worst ${checkValueText(check, units)} in ${where.name}.`;
  return <EdgeRuler uses={uses} worst={use} hasTarget={target !== null} label={said} names={names} />;
}
