import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';
import { putIssuesInOwnWords } from '../shared/issue-words';
import { poolOf } from './db/pool';
import type { Environment } from './env';
import { mountRoutes } from './http/mount-routes';
import { describeApi } from './http/open-api';
import { setUpPassport } from './http/passport';
import { handleProblem, handleUnknownRoute } from './http/problem-handler';
import { refuseCrossSite } from './http/refuse-cross-site';
import { logRequests } from './http/request-log';
import type { Deps } from './http/route';
import { securityHeaders } from './http/security-headers';
import { serveClient } from './http/serve-client';
import { keepSessions } from './http/session';
import { createSignInThrottle } from './http/sign-in-throttle';
import type { Clock } from './kernel/clock';
import { allRoutes } from './all-routes';

export type AppOptions = {
  dataSource: DataSource;
  env: Environment;
  logger: Logger;
  now: Clock;
  sessionSecret: string;
  isHttps: boolean;
  version: string;
  /** Folder of the built page; none in API tests. */
  clientFolder: string | null;
};

/** The whole application: what every request passes, in order. */
export function createApp(options: AppOptions): Express {
  const { dataSource, env, logger, now, isHttps } = options;
  putIssuesInOwnWords();
  const deps: Deps = { dataSource, db: dataSource.manager, env, logger, now };
  const pool = poolOf(dataSource);
  const authenticator = setUpPassport(deps.db);
  const routes = allRoutes({ authenticator, throttle: createSignInThrottle(pool), version: options.version });

  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  app.set('query parser', 'simple');
  app.use(logRequests(logger));
  app.use(securityHeaders(isHttps));
  if (options.clientFolder) app.use(serveClient(options.clientFolder));
  app.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  app.use(refuseCrossSite);
  app.use(keepSessions(pool, options.sessionSecret, isHttps));
  app.use(authenticator.session());
  app.use(express.json({ limit: '1mb' }));
  app.get('/api/openapi.json', (_request, response) => response.json(describeApi(routes, options.version)));
  app.use('/api', mountRoutes(routes, deps));
  app.use(handleUnknownRoute);
  app.use(handleProblem);
  return app;
}
