import { useInfiniteQuery } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
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
  return <Menu label={project.name} kind="quiet" items={[...items, all]} />;
}
