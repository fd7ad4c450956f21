import type { Href } from 'expo-router';

export type ProjectPage = 'home' | 'plant' | 'bench' | 'cases' | 'limits' | 'analyses' | 'members' | 'activity';

export const projectPath = (projectId: string, page: ProjectPage = 'home') =>
  `/projects/${projectId}${page === 'home' ? '' : `/${page}`}` as Href;
export const analysisPath = (projectId: string, analysisId: string) => `/projects/${projectId}/analyses/${analysisId}` as Href;
export const benchPath = (projectId: string, designId: string, revision: number) =>
  `/projects/${projectId}/bench?design=${designId}&revision=${revision}` as Href;

const withNext = (path: string, next: string, email?: string) => {
  const query = new URLSearchParams({ ...(next !== '/' && { next }), ...(email && { email }) }).toString();
  return (query === '' ? path : `${path}?${query}`) as Href;
};

interface OnBench {
  caseId: string;
  /** The bench's own choice where absent. */
  design?: { id: string; revision: number };
}

/** One case on the bench, under a kept revision of a design. */
export const caseBenchPath = (projectId: string, { caseId, design }: OnBench) =>
  `${design ? `${benchPath(projectId, design.id, design.revision)}&` : `${projectPath(projectId, 'bench')}?`}case=${caseId}` as Href;

/** Sign-in that leads back to the page asked for, with the address written in where it is known. */
export const signInPath = (next: string, email?: string) => withNext('/sign-in', next, email);
export const signUpPath = (next: string, email?: string) => withNext('/sign-up', next, email);

/** Where to go after signing in: a path of this site, never another's. */
export function safeNext(next: string | undefined): Href {
  const own = next !== undefined && /^\/(?![/\\])/.test(next);
  return (own ? next : '/') as Href;
}
