import { useLocalSearchParams } from 'expo-router';
import { AnalysisScreen } from '@/components/navigation/loop-screens';

export default function AnalysisRoute() {
  const { analysisId } = useLocalSearchParams<{ analysisId: string }>();
  return <AnalysisScreen key={analysisId} analysisId={analysisId} />;
}
