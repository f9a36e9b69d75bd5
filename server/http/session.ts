import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';
import type { Pool } from 'pg';

const hour = 3_600_000;
const PgStore = connectPgSimple(session);

/** Sessions in PostgreSQL: a cookie that scripts cannot read, renewed by use, gone after a working day. */
export const keepSessions = (pool: Pool, secret: string, isHttps: boolean) =>
  session({
    name: 'leeward.session',
    secret,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { httpOnly: true, sameSite: 'lax', secure: isHttps, maxAge: 12 * hour, path: '/' },
    store: new PgStore({ pool, tableName: 'session', pruneSessionInterval: 15 * 60 }),
  });
