import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { vi } from 'vitest';
import { ProjectContext } from '@/components/navigation/project-context';
import { defaultPreferences, type Invitation, type Me, type Member, type ProblemDetails, type Role } from '@/contract';
import { createQueryClient, meKey } from '@/hooks/api/query-client';
import type { ReadProject } from '@/hooks/queries/projects';

export const mira: Me = {
  id: 'mira',
  name: 'Mira Castellan',
  email: 'mira@heron-racing.example',
  emailVerified: true,
  teams: [],
  preferences: defaultPreferences,
};

export const member = (userId: string, name: string, role: Role): Member => ({
  userId,
  name,
  email: `${userId}@heron-racing.example`,
  role,
  since: '2026-05-01T08:00:00.000Z',
  etag: `"${userId} 1"`,
});

export const invitation: Invitation = {
  id: 'i1',
  email: 'rasmus@heron-racing.example',
  role: 'viewer',
  invitedBy: 'Mira Castellan',
  sentAt: '2026-05-13T08:00:00.000Z',
  expiresAt: '2026-05-27T08:00:00.000Z',
};

interface Asked {
  method: string;
  path: string;
  body: unknown;
  ifMatch: string | null;
}
type Answer = readonly [status: number, body: unknown];

const refusal = (status: number, detail: string, pointer?: string): Answer => {
  const body: ProblemDetails = { type: 'about:blank', title: 'No', status, detail, ...(pointer && { errors: [{ pointer, detail }] }) };
  return [status, body];
};
export { refusal };

/** A server that answers "METHOD /path" as it is told; what it was asked is kept. */
export function fakeServer(answers: Record<string, Answer>): Asked[] {
  const asked: Asked[] = [];
  vi.stubGlobal('fetch', async (url: string, init: RequestInit) => {
    const path = url.replace(/^\/api/, '').replace(/\?.*$/, '');
    const method = init.method ?? 'GET';
    const ifMatch = new Headers(init.headers).get('if-match');
    asked.push({ method, path, body: init.body ? JSON.parse(String(init.body)) : undefined, ifMatch });
    const [status, body] = answers[`${method} ${path}`] ?? refusal(404, 'Not here.');
    return new Response(body === null ? null : JSON.stringify(body), { status });
  });
  return asked;
}

/** A part of a project's page, as one of its people sees it. */
export function renderInProject(part: ReactNode, { role = 'owner', archived = false }: { role?: Role; archived?: boolean } = {}) {
  const client = createQueryClient();
  client.setQueryData(meKey, mira);
  const project = { id: 'p1', name: 'Wet-track speed hold', role, archived, people: [] } as unknown as ReadProject;
  const context = { project, openPages: () => undefined, phoneActions: null };
  return render(
    <QueryClientProvider client={client}>
      <ProjectContext.Provider value={context}>{part}</ProjectContext.Provider>
    </QueryClientProvider>,
  );
}
