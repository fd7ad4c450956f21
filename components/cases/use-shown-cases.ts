import { useMemo } from 'react';
import { edgesOf } from '@/analysis/project';
import { useProject } from '@/components/navigation/project-context';
import { useUnits } from '@/components/ui/units';
import type { CasesLink } from './cases-link';
import { caseGrid } from './model/case-grid';
import { type CaseNumber, caseNumber } from './model/case-number';
import type { CaseView } from './model/case-view';
import { shownQuantities, shownQuantity } from './model/shown-quantities';
import { worstNumber } from './model/worst-number';
import type { EndOfAxis } from './panel/end-words';
import type { CaseData } from './use-case-data';

/** What the page shows of its cases: the number that was chosen, the worst of it, the grid, and the case that was opened. */
export function useShownCases({ views, analysis }: CaseData, link: CasesLink) {
  const { operatingRange } = useProject();
  const units = useUnits();
  const headline = analysis?.headline ?? null;
  const quantity = shownQuantity(link.number, analysis);
  const quantities = useMemo(() => shownQuantities(analysis), [analysis]);
  const layout = useMemo(() => caseGrid(views), [views]);
  const numbers = useMemo(() => views.map((view) => caseNumber(view, quantity, units)), [views, quantity, units]);
  const byId = useMemo(() => new Map(numbers.map((number) => [number.view.kept.id, number])), [numbers]);
  const worst = useMemo((): CaseNumber | null => {
    // Of equals the headline has chosen one; the page singles out the same.
    const first = headline?.quantity === quantity && headline.case ? byId.get(headline.case.id) : undefined;
    return first && !first.view.outdated ? first : worstNumber(numbers, quantity);
  }, [headline, quantity, byId, numbers]);
  const selected = useMemo((): CaseView => {
    const asked = (id: string | undefined) => views.find(({ kept }) => kept.id === id);
    return asked(link.case) ?? asked(headline?.case?.id) ?? worst?.view ?? views[0];
  }, [views, link.case, headline, worst]);
  const ends = useMemo((): EndOfAxis[] => {
    const checked = { cases: views.map(({ kept }) => kept), operatingRange };
    return edgesOf(selected.kept.id, checked).map((edge) => ({
      edge,
      at: selected.kept.axes[edge.axis] ?? 0,
      declared: operatingRange.find(({ axis }) => axis === edge.axis),
    }));
  }, [views, operatingRange, selected]);
  const alsoHere = useMemo(() => {
    const cell = layout?.cells.flat().find((all) => all.includes(selected)) ?? [];
    return cell.filter((view) => view !== selected);
  }, [layout, selected]);
  return { quantity, quantities, layout, numbers: byId, worst, selected, ends, alsoHere, headline };
}
