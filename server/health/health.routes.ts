import { healthSchema } from '../../shared/contract/health';
import { route, type Route } from '../http/route';

export const healthRoutes = (version: string): Route[] => [
  route({
    method: 'get',
    path: '/health',
    permission: 'public',
    summary: 'Whether the server and its database answer',
    response: healthSchema,
    handle: async ({ deps, response }) => {
      const isUp = await deps.db.query('select 1').then(
        () => true,
        () => false,
      );
      if (!isUp) response.status(503);
      return { status: isUp ? 'ok' : 'unavailable', version } as const;
    },
  }),
];
