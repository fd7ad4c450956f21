import type { IconName } from '@/components/ui/icon';
import type { ProjectPage } from './routes';

export interface PageEntry {
  page: ProjectPage;
  name: string;
  icon: IconName;
  about: string;
  /** Where back leads from a page that stands under another; on a phone it has no page bar. */
  up?: ProjectPage;
  /** The page of the bars that it counts as. */
  tab?: ProjectPage;
}

/** Every page of a project, in the order in which a loop is worked on. */
export const allPages: readonly PageEntry[] = [
  { page: 'home', name: 'Home', icon: 'home', about: 'where it stands' },
  { page: 'plant', name: 'Plant', icon: 'plant', about: 'what the loop drives' },
  { page: 'bench', name: 'Bench', icon: 'bench', about: 'gains and curves' },
  { page: 'cases', name: 'Cases', icon: 'cases', about: 'what it must survive' },
  { page: 'limits', name: 'Limits', icon: 'limits', about: 'what is demanded', up: 'cases', tab: 'cases' },
  { page: 'analyses', name: 'Analyses', icon: 'list', about: 'what was kept' },
  { page: 'members', name: 'Members', icon: 'people', about: 'who may do what', up: 'home' },
  { page: 'activity', name: 'Activity', icon: 'clock', about: 'who did what', up: 'home' },
];

/** Those that stand in the bars; the others are reached from them. */
export const pages = allPages.filter(({ up }) => up === undefined);

/** The page that a path of a project belongs to. */
export function pageAt(pathname: string): PageEntry {
  const part = pathname.split('/')[3];
  return allPages.find(({ page }) => page === part) ?? allPages[0];
}
