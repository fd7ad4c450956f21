import { View } from 'react-native';
import { useCaseCurves } from '@/components/analyses/use-case-curves';
import { CursorProvider, PlaneChart } from '@/components/charts';
import { useProject } from '@/components/navigation/project-context';
import { QueryView } from '@/components/ui/query-view';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { chartLimits } from '@/figures';

/** The worst case of the newest analysis on the contours of |S|. */
export function LatestPlane({ height }: { height: number }) {
  const units = useUnits();
  const { id, latestAnalysis, headline } = useProject();
  const { kept, curves, design } = useCaseCurves({
    projectId: id,
    analysisId: latestAnalysis?.id ?? '',
    caseId: headline?.case?.id,
  });
  const limits = chartLimits(kept.data?.inputs.limits ?? []);
  return (
    <View style={{ gap: 8 }}>
      <QueryView query={{ ...curves, data: design }} waiting="Computing the curves">
        {(a) => (
          <CursorProvider>
            <PlaneChart a={a} limits={limits} units={units} height={height} />
            <Text step="note" tone="ink2">
              {`${a.label}, ${headline?.case?.name ?? 'worst case'}`}
            </Text>
          </CursorProvider>
        )}
      </QueryView>
    </View>
  );
}
