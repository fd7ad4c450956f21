import type { Request } from 'express';
import type { z } from 'zod';
import type { Permission, Role } from '@/contract';
import type { SignedIn } from '../auth/signed-in';
import type { Context } from '../context';
import type { Answer } from './answer';
import type { EventStream } from './event-stream';

/** A member of the path's `:projectId` whose role has the permission. An archived project is closed to all but `read`, unless said otherwise. */
interface ProjectAccess {
  readonly project: Permission;
  readonly whileArchived?: true;
}

/** Who may call a route: anyone, anyone signed in, or a member. */
export type Access = 'public' | 'session' | ProjectAccess;

export interface Input {
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
}

type Parsed<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined;

export interface ProjectSeat {
  readonly id: string;
  readonly role: Role;
}

/** A call that has been validated and authorised: what a handler is given. */
export interface Visit<A extends Access = Access, I extends Input = Input> {
  readonly context: Context;
  readonly params: Parsed<I['params']>;
  readonly query: Parsed<I['query']>;
  readonly body: Parsed<I['body']>;
  readonly user: A extends 'public' ? SignedIn | null : SignedIn;
  readonly project: A extends { project: Permission } ? ProjectSeat : null;
  /** Throws 428 or 412 unless If-Match names this version. */
  readonly expectVersion: (version: number) => void;
  readonly request: Request;
}

export interface RouteDefinition<A extends Access, I extends Input, O extends z.ZodType | null> {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** As Express writes it: `/api/projects/:projectId`. */
  readonly path: string;
  readonly summary: string;
  /** The heading under which the API's page lists it. */
  readonly tag: string;
  readonly access: A;
  readonly input?: I;
  /** Null where the answer has no body. */
  readonly output: O;
  /** Of a success; 200, or 204 where there is no body. */
  readonly status?: number;
  /** A POST takes an Idempotency-Key unless it computes without keeping, or sets cookies. */
  readonly idempotent?: boolean;
  /** Answers by Server-Sent Events, each of them one `output`. */
  readonly events?: boolean;
  handler(visit: Visit<A, I>): Reply<O> | Promise<Reply<O>>;
}

type Body<O> = O extends z.ZodType ? z.input<O> : void;
type Reply<O> = Body<O> | Answer<Body<O>> | EventStream<Body<O>>;

/** A route whose own types are forgotten, so that all routes fit in one list. */
export interface Route {
  readonly method: RouteDefinition<Access, Input, null>['method'];
  readonly path: string;
  readonly summary: string;
  readonly tag: string;
  readonly access: Access;
  readonly input: Input;
  readonly output: z.ZodType | null;
  readonly status: number;
  readonly idempotent: boolean;
  readonly events: boolean;
  handler(visit: AnyVisit): unknown;
}

export interface AnyVisit extends Omit<Visit, 'params' | 'query' | 'body' | 'user' | 'project'> {
  readonly params: unknown;
  readonly query: unknown;
  readonly body: unknown;
  readonly user: SignedIn | null;
  readonly project: ProjectSeat | null;
}

/** Declares a route. It cannot exist without validation, authorisation and a place in the OpenAPI document. */
export function route<const A extends Access, const I extends Input, const O extends z.ZodType | null>(
  definition: RouteDefinition<A, I, O>,
): Route {
  const { input = {}, output, status = output ? 200 : 204, idempotent = definition.access !== 'public', events = false } = definition;
  return { ...definition, input, status, events, idempotent: idempotent && definition.method === 'post' } as Route;
}
