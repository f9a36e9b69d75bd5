import type passport from 'passport';
import { healthRoutes } from './health/health.routes';
import type { Route } from './http/route';
import type { SignInThrottle } from './http/sign-in-throttle';
import { roomRoutes } from './rooms/room.routes';
import { sessionRoutes } from './session/session.routes';

type Parts = { authenticator: passport.Authenticator; throttle: SignInThrottle; version: string };

/** Every endpoint of the API, below /api. */
export const allRoutes = ({ authenticator, throttle, version }: Parts): Route[] => [
  ...healthRoutes(version),
  ...sessionRoutes(authenticator, throttle),
  ...roomRoutes,
];
