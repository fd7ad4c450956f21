import { useQuery } from '@tanstack/react-query';
import { useProject } from '@/components/navigation/project-context';
import { VerdictStrip } from '@/components/verdict/verdict-strip';
import { analysisQuery } from '@/hooks/queries/analyses';

/** The headline of the newest analysis; nothing until something was analysed. */
export function HomeStrip() {
  const { id, headline, latestAnalysis } = useProject();
  const { data: analysis } = useQuery({ ...analysisQuery(id, latestAnalysis?.id ?? ''), enabled: latestAnalysis !== null });
  if (!analysis || !headline) return null;
  return <VerdictStrip headline={headline} room={analysis.room} results={analysis.results} />;
}
