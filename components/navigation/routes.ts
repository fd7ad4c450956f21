import type { Href } from 'expo-router';

export type ProjectPage = 'home' | 'plant' | 'bench' | 'cases' | 'limits' | 'analyses' | 'members' | 'activity';

export const projectPath = (projectId: string, page: ProjectPage = 'home') =>
  `/projects/${projectId}${page === 'home' ? '' : `/${page}`}` as Href;
export const analysisPath = (projectId: string, analysisId: string) => `/projects/${projectId}/analyses/${analysisId}` as Href;
export const benchPath = (projectId: string, designId: string, revision: number) =>
  `/projects/${projectId}/bench?design=${designId}&revision=${revision}` as Href;

/** Sign-in that leads back to the page asked for. */
export const signInPath = (next: string) => (next === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(next)}`) as Href;

/** Where to go after signing in: a path of this site, never another's. */
export function safeNext(next: string | undefined): Href {
  const own = next !== undefined && /^\/(?![/\\])/.test(next);
  return (own ? next : '/') as Href;
}
