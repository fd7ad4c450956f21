import { createContext, useContext } from 'react';
import { allows, type Permission } from '@/contract/permissions';
import type { ReadProject } from '@/hooks/queries/projects';

export interface ProjectContextValue {
  project: ReadProject;
  /** Opens the sheet with all pages, for what takes the page bar's place on a phone. */
  openPages: () => void;
  /** Where a page's own actions stand in the phone's bar; null from 700 on. */
  phoneActions: HTMLElement | null;
}

export const ProjectContext = createContext<ProjectContextValue | null>(null);

function useProjectContext(): ProjectContextValue {
  const value = useContext(ProjectContext);
  if (!value) throw new Error('This page stands inside a project.');
  return value;
}

export const useProject = (): ReadProject => useProjectContext().project;
export const useOpenPages = (): (() => void) => useProjectContext().openPages;
export const usePhoneActions = (): HTMLElement | null => useProjectContext().phoneActions;

/** Whether the reader's role lets them, by the one table of who may do what. */
export const useMay = (permission: Permission): boolean => allows(useProject().role, permission);

/** Whether the reader may change plants, designs and analyses; who may not sees no controls for it. */
export const useMayEdit = (): boolean => {
  const { archived } = useProject();
  return useMay('edit') && !archived;
};
