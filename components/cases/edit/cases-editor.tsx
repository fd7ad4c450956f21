import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { QueryView } from '@/components/ui/query-view';
import { gutter } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { plantsQuery } from '@/hooks/queries/plants';
import { GridEditor } from '../grid-editor/grid-editor';
import type { CaseView } from '../model/case-view';
import { CaseEditor } from './case-editor';

interface CasesEditorProps {
  /** "new", "grid", or the id of the case that is changed. */
  what: string;
  views: readonly CaseView[];
  onDone: (caseId?: string) => void;
}

/** What the address asks to be edited: one case, a case to be, or a whole grid. */
export function CasesEditor({ what, views, onDone }: CasesEditorProps) {
  const { id } = useProject();
  const plants = useQuery(plantsQuery(id));
  const phone = useLayout() === 'phone';
  return (
    <View style={phone ? { padding: gutter.phone } : null}>
      <QueryView query={plants} waiting="Fetching the plants">
        {(items) =>
          what === 'grid' ? (
            <GridEditor plants={items} caseCount={views.length} onDone={onDone} />
          ) : (
            <CaseEditor key={what} what={what} kept={views.find(({ kept }) => kept.id === what)?.kept} plants={items} onDone={onDone} />
          )
        }
      </QueryView>
    </View>
  );
}
