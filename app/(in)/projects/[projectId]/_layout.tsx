import { Slot, useLocalSearchParams } from 'expo-router';
import { fetchLoopScreens } from '@/components/navigation/loop-screens';
import { ProjectFrame } from '@/components/navigation/project-frame';
import { useFetchAhead } from '@/hooks/use-fetch-ahead';

const pages = [
  () => import('./index'),
  () => import('./plant'),
  () => import('./bench'),
  () => import('./cases'),
  () => import('./limits'),
  () => import('./members'),
  () => import('./activity'),
  () => import('./analyses/index'),
  () => import('./analyses/[analysisId]'),
  fetchLoopScreens,
];

export default function ProjectLayout() {
  const { projectId } = useLocalSearchParams<{ projectId: string }>();
  useFetchAhead(pages);
  return (
    <ProjectFrame key={projectId} projectId={projectId}>
      <Slot />
    </ProjectFrame>
  );
}
