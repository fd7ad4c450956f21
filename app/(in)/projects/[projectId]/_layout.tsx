import { Slot, useLocalSearchParams } from 'expo-router';
import { ProjectFrame } from '@/components/navigation/project-frame';

export default function ProjectLayout() {
  const { projectId } = useLocalSearchParams<{ projectId: string }>();
  return (
    <ProjectFrame key={projectId} projectId={projectId}>
      <Slot />
    </ProjectFrame>
  );
}
