import type { IconName } from '@/components/ui/icon';
import type { ProjectPage } from './routes';

export interface PageEntry {
  page: ProjectPage;
  name: string;
  icon: IconName;
  about: string;
}

/** The pages of a project, in the order in which a loop is worked on. */
export const pages: readonly PageEntry[] = [
  { page: 'home', name: 'Home', icon: 'home', about: 'where it stands' },
  { page: 'plant', name: 'Plant', icon: 'plant', about: 'what the loop drives' },
  { page: 'bench', name: 'Bench', icon: 'bench', about: 'gains and curves' },
  { page: 'analyses', name: 'Analyses', icon: 'list', about: 'what was kept' },
];

/** Which page a path of a project belongs to. */
export function pageOf(pathname: string): ProjectPage {
  const part = pathname.split('/')[3];
  return pages.find(({ page }) => page === part)?.page ?? 'home';
}
