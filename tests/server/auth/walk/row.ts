import type { Permission } from '@/contract';
import type { Client } from '../../../support/client';
import type { World } from './world';

/** One id of each kind, under the names that paths give them: `{ projectId, plantId, … }`. */
export type Ids = Readonly<Record<string, string>>;

/** How one route is called rightly, and who may. Written by hand, so that a route which asks for too little is found. */
export interface Row {
  readonly needs: 'public' | 'session' | Permission;
  /** Makes what the call uses up, for whoever will call; ids that stand in place of the project's own. */
  readonly prepare?: (world: World, caller: Client) => Ids | Promise<Ids>;
  readonly body?: (ids: Ids, caller: Client) => unknown;
  readonly query?: string;
  /** A password takes long to check: one caller stands for everyone who is signed in. */
  readonly slow?: true;
}

/** By the operation's name: `POST /api/projects/{projectId}/plants`. */
export type Rows = Readonly<Record<string, Row>>;
