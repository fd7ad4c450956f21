import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from '@/server/app';
import type { AnyVisit, Route } from '@/server/http/route';
import type { TestApp } from '../../../support/test-app';
import { documentAt, type Operation } from './operations';
import { elsewhere, type World } from './world';

/** A second server over the same database, with routes as a test gives them. */
export interface Sabotaged {
  readonly world: World;
  readonly operations: readonly Operation[];
  readonly close: () => void;
}

export async function serve({ context }: TestApp, world: World, routes: readonly Route[]): Promise<Sabotaged> {
  const server = createServer(createApp(context, routes));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const close = () => {
    server.closeAllConnections();
    server.close();
  };
  return { world: elsewhere(world, url), operations: await documentAt(url), close };
}

/** The route as it would be had its author forgotten to ask whether the caller belongs to the project. */
export function withoutCheck(route: Route): Route {
  if (typeof route.access !== 'object') return route;
  const handler = (visit: AnyVisit) =>
    route.handler({ ...visit, project: { id: (visit.params as { projectId: string }).projectId, role: 'owner' } });
  return { ...route, access: 'session', handler };
}

/** The route as it would be had its author let everyone in the project do what needs more. */
export const openToReaders = (route: Route): Route =>
  typeof route.access === 'object' ? { ...route, access: { ...route.access, project: 'read' } } : route;
