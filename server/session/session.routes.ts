import type passport from 'passport';
import { linkSchema, sessionSchema, signInSchema, useLinkSchema } from '../../shared/contract/session';
import { z } from 'zod';
import { authenticate, endSession, startSession } from '../http/passport';
import { route, type Route } from '../http/route';
import type { SignInThrottle } from '../http/sign-in-throttle';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { describeSession } from './describe-session';
import { describeLink, useLink } from './use-sign-in-link';

export function sessionRoutes(authenticator: passport.Authenticator, throttle: SignInThrottle): Route[] {
  return [
    route({
      method: 'get',
      path: '/session',
      permission: 'public',
      summary: 'Who is signed in, if anybody',
      response: sessionSchema,
      handle: ({ request, deps }) => describeSession(deps.db, (request.user as Actor | undefined) ?? null),
    }),
    route({
      method: 'post',
      path: '/session',
      permission: 'public',
      summary: 'Sign in',
      body: signInSchema,
      response: sessionSchema,
      handle: async ({ request, body, deps }) => {
        const attempt = { address: request.ip ?? '', email: body.email };
        await throttle.guard(attempt);
        const actor = await authenticate(request, authenticator);
        if (!actor) {
          await throttle.fail(attempt);
          throw new Problem('wrong-credentials', 'E-mail or password is not right. Nobody is signed in.');
        }
        await throttle.forgive(attempt);
        await startSession(request, actor);
        return describeSession(deps.db, actor);
      },
    }),
    route({
      method: 'delete',
      path: '/session',
      permission: 'public',
      summary: 'Sign out',
      handle: ({ request }) => endSession(request),
    }),
    route({
      method: 'get',
      path: '/sign-in-links/:token',
      permission: 'public',
      summary: 'What a one-time link is for',
      params: z.object({ token: z.string().max(200) }),
      response: linkSchema,
      handle: ({ params, deps }) => describeLink(deps, params.token),
    }),
    route({
      method: 'post',
      path: '/sign-in-links',
      permission: 'public',
      summary: 'Use a one-time link: choose a password, and sign in',
      body: useLinkSchema,
      response: sessionSchema,
      handle: async ({ request, body, deps }) => {
        const actor = await useLink(deps, body);
        await startSession(request, actor);
        return describeSession(deps.db, actor);
      },
    }),
  ];
}
