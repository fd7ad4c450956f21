import { useQuery } from '@tanstack/react-query';
import { usePathname } from 'expo-router';
import { type PropsWithChildren, useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Banner } from '@/components/ui/banner';
import { IconButton } from '@/components/ui/icon-button';
import { QueryView } from '@/components/ui/query-view';
import { HiddenHeading } from '@/components/ui/hidden-heading';
import { useLayout } from '@/components/ui/use-layout';
import { hasStatus } from '@/hooks/api/problem';
import { projectQuery, type ReadProject } from '@/hooks/queries/projects';
import { DeskFrame } from './desk-frame';
import { MainArea } from './main-area';
import { PageBar } from './page-bar';
import { pageAt, pages } from './pages';
import { PagesSheet } from './pages-sheet';
import { PhoneTop } from './phone-top';
import { ProjectContext } from './project-context';
import { ProjectSwitch } from './project-switch';
import { ProjectTabs } from './project-tabs';
import { projectPath } from './routes';
import { SignalBanner } from './signal-banner';
import { TopBar } from './top-bar';

/** What stands round every page of a project: the bars of the layout, the sheet of pages, and the project itself for those inside. */
export function ProjectFrame({ projectId, children }: PropsWithChildren<{ projectId: string }>) {
  const project = useQuery(projectQuery(projectId));
  const phone = useLayout() === 'phone';
  // What was read stays readable, but not to whom it is no longer shown.
  if (project.data && !hasStatus(project.error, 404)) return <LoadedFrame project={project.data}>{children}</LoadedFrame>;
  return (
    <DeskFrame title="Project" up="/">
      {phone ? null : <HiddenHeading>Project</HiddenHeading>}
      <QueryView
        query={{ ...project, data: undefined }}
        waiting="Fetching the project"
        missing="No such project, or it is not yours to see."
      >
        {() => null}
      </QueryView>
    </DeskFrame>
  );
}

function LoadedFrame({ project, children }: PropsWithChildren<{ project: ReadProject }>) {
  const phone = useLayout() === 'phone';
  const pathname = usePathname();
  const { page: current, name: pageName, up: above = 'home', tab = current } = pageAt(pathname);
  const [sheet, setSheet] = useState(false);
  const [phoneActions, setPhoneActions] = useState<View | null>(null);
  const context = useMemo(
    () => ({ project, openPages: () => setSheet(true), phoneActions: phoneActions as unknown as HTMLElement | null }),
    [project, setSheet, phoneActions],
  );
  const place = { projectId: project.id, current: tab };
  const home = current === 'home';
  const deeper = pathname !== projectPath(project.id, current);
  const up = deeper ? projectPath(project.id, current) : home ? '/' : projectPath(project.id, above);
  return (
    <ProjectContext.Provider value={context}>
      <View style={styles.frame}>
        {phone ? (
          <PhoneTop title={home ? project.name : pageName} sub={home ? project.vehicle : project.name} up={up}>
            <View ref={setPhoneActions} />
            <IconButton icon="more" label="All pages" onPress={context.openPages} />
          </PhoneTop>
        ) : (
          <TopBar>
            <ProjectSwitch project={project} />
            <ProjectTabs {...place} />
          </TopBar>
        )}
        <SignalBanner />
        {project.archived ? <Banner lead="Archived." text="It can be read; nothing changes in it." /> : null}
        <MainArea>
          {!phone && (home || current === 'bench') ? <HiddenHeading>{home ? project.name : `Bench, ${project.name}`}</HiddenHeading> : null}
          {children}
        </MainArea>
        {phone && pages.some(({ page }) => page === current) && current !== 'bench' ? <PageBar {...place} /> : null}
        <PagesSheet projectId={project.id} current={current} open={sheet} onClose={() => setSheet(false)} />
      </View>
    </ProjectContext.Provider>
  );
}

const styles = StyleSheet.create({ frame: { flex: 1, minHeight: 0 } });
