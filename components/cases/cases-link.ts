import { useLocalSearchParams, useRouter } from 'expo-router';
import { useCallback } from 'react';

export type CasesView = 'grid' | 'list' | 'chart';
type Parameter = 'case' | 'number' | 'view' | 'edit';
export type CasesLink = Readonly<Partial<Record<Parameter, string>>>;

const views: readonly CasesView[] = ['grid', 'list', 'chart'];

/** How the cases are laid out: as the address says, else as a grid. */
export const viewIn = ({ view }: CasesLink): CasesView => views.find((one) => one === view) ?? 'grid';

/** What can be shared of the page: the case, the number and the layout that are shown, and what is being edited. */
export function useCasesLink(): [CasesLink, (change: Partial<Record<Parameter, string | undefined>>) => void] {
  const { case: caseId, number, view, edit } = useLocalSearchParams<Record<Parameter, string>>();
  const router = useRouter();
  const change = useCallback((next: Partial<Record<Parameter, string | undefined>>) => router.setParams(next), [router]);
  return [{ case: caseId, number, view, edit }, change];
}
