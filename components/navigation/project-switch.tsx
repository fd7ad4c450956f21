import { useInfiniteQuery } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { Menu } from '@/components/ui/menu';
import { projectsQuery, type ReadProject } from '@/hooks/queries/projects';
import { projectPath } from './routes';

/** The project's name, and under it the others. */
export function ProjectSwitch({ project }: { project: ReadProject }) {
  const router = useRouter();
  const { data: projects = [project] } = useInfiniteQuery(projectsQuery());
  const items = projects.map(({ id, name, vehicle }) => ({
    key: id,
    label: name,
    hint: vehicle,
    current: id === project.id,
    onSelect: () => router.push(projectPath(id)),
  }));
  const all = { key: 'all', label: 'All projects', onSelect: () => router.push('/') };
  return (
    <View style={styles.name}>
      <Menu label={project.name} kind="quiet" items={[...items, all]} />
    </View>
  );
}

const styles = StyleSheet.create({ name: { flexShrink: 1, minWidth: 0, maxWidth: 340 } });
