import type { Request, RequestHandler, Response } from 'express';
import type { DataSource, EntityManager } from 'typeorm';
import type { Logger } from 'pino';
import type { z } from 'zod';
import type { Action } from '../../shared/permissions';
import type { Environment } from '../env';
import type { Actor } from '../kernel/actor';
import type { Clock } from '../kernel/clock';

/** What the application hands to its routes. */
export type Deps = {
  dataSource: DataSource;
  db: EntityManager;
  env: Environment;
  logger: Logger;
  now: Clock;
};

/** `public`: also signed out. `signed-in`: any role and none. Else an action of the permission table. */
export type Permission = Action | 'public' | 'signed-in';

export type Call<P, Q, B> = {
  params: P;
  query: Q;
  body: B;
  /** The signed-in person; reading it on a public route answers 401. */
  actor: Actor;
  deps: Deps;
  request: Request;
  response: Response;
};

type Output<S> = S extends z.ZodType ? z.output<S> : undefined;

export type RouteSpec<P, Q, B, R> = {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Below /api, in Express notation. */
  path: string;
  permission: Permission;
  summary: string;
  params?: P;
  query?: Q;
  body?: B;
  /** Absent: the handler writes the answer itself (a download), or there is none (204). */
  response?: R;
  status?: number;
  /** Runs after the permission and before the input is read: throttles, multipart. */
  before?: (deps: Deps) => RequestHandler[];
  /** Name of the multipart field that carries files. */
  multipart?: string;
};

export type Route = RouteSpec<
  z.ZodType | undefined,
  z.ZodType | undefined,
  z.ZodType | undefined,
  z.ZodType | undefined
> & {
  handle: (call: Call<never, never, never>) => unknown;
};

/** Declares one endpoint: its guards and schemas stand here, and the OpenAPI document is made from them. */
export function route<
  P extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
  B extends z.ZodType | undefined = undefined,
  R extends z.ZodType | undefined = undefined,
>(
  spec: RouteSpec<P, Q, B, R> & {
    handle: (
      call: Call<Output<P>, Output<Q>, Output<B>>,
    ) => R extends z.ZodType ? z.input<R> | Promise<z.input<R>> : unknown;
  },
): Route {
  return spec as unknown as Route;
}
