import { createContext, useContext } from 'react';
import type { Role } from '@/contract';
import type { ReadProject } from '@/hooks/queries/projects';

export interface ProjectContextValue {
  project: ReadProject;
  /** Opens the sheet with all pages, for what takes the page bar's place on a phone. */
  openPages: () => void;
}

export const ProjectContext = createContext<ProjectContextValue | null>(null);

function useProjectContext(): ProjectContextValue {
  const value = useContext(ProjectContext);
  if (!value) throw new Error('This page stands inside a project.');
  return value;
}

export const useProject = (): ReadProject => useProjectContext().project;
export const useOpenPages = (): (() => void) => useProjectContext().openPages;

const mayEdit: readonly Role[] = ['owner', 'editor'];

/** Whether the reader may change plants, designs and analyses; who may not sees no controls for it. */
export const useMayEdit = (): boolean => {
  const { role, archived } = useProject();
  return mayEdit.includes(role) && !archived;
};
