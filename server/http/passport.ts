import type { Request } from 'express';
import passport from 'passport';
import { Strategy } from 'passport-local';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../kernel/actor';
import { findActor } from '../people/account.store';
import { verifyCredentials } from '../session/verify-credentials';

/** Passport with one strategy: e-mail and password. Each request reads the person afresh, so a lost role is lost at once. */
export function setUpPassport(db: EntityManager) {
  const authenticator = new passport.Passport();
  authenticator.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      verifyCredentials(db, email, password).then((actor) => done(null, actor ?? false), done);
    }),
  );
  authenticator.serializeUser((user, done) => done(null, (user as Actor).id));
  authenticator.deserializeUser((id: string, done) => {
    findActor(db, id).then((actor) => done(null, actor ?? false), done);
  });
  return authenticator;
}

/** Runs the strategy; null when e-mail and password do not belong together. */
export function authenticate(request: Request, authenticator: passport.Authenticator): Promise<Actor | null> {
  return new Promise((resolve, reject) => {
    const decide = (error: unknown, user: Actor | false) => (error ? reject(error) : resolve(user || null));
    authenticator.authenticate('local', decide)(request, request.res, reject);
  });
}

/** Signs in under a new session id (passport renews it), so that an id known before is worth nothing. */
export const startSession = (request: Request, actor: Actor): Promise<void> =>
  new Promise((resolve, reject) => {
    request.logIn(actor as Express.User, (error?: unknown) => (error ? reject(error) : resolve()));
  });

export const endSession = (request: Request): Promise<void> =>
  new Promise((resolve, reject) => {
    request.session.destroy((error?: unknown) => (error ? reject(error) : resolve()));
  });

export type Authenticator = passport.Authenticator;
