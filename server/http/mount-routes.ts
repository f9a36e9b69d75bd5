import { Router, type RequestHandler } from 'express';
import { readInput } from './read-input';
import { actorOf, requirePermission } from './require-permission';
import type { Call, Deps, Route } from './route';

/** The guards of a route in their order: permission, throttles, input, use case, answer. */
function answer(route: Route, deps: Deps): RequestHandler {
  return async (request, response) => {
    const call = {
      params: route.params ? readInput(route.params, request.params) : undefined,
      query: route.query ? readInput(route.query, request.query) : undefined,
      body: route.body ? readInput(route.body, request.body ?? {}) : undefined,
      get actor() {
        return actorOf(request);
      },
      deps,
      request,
      response,
    };
    const result = await route.handle(call as unknown as Call<never, never, never>);
    if (response.headersSent) return;
    if (route.response)
      response.status(route.status ?? response.statusCode).json(route.response.parse(result));
    else response.status(route.status ?? 204).end();
  };
}

export function mountRoutes(routes: Route[], deps: Deps): Router {
  const router = Router();
  for (const route of routes)
    router[route.method](
      route.path,
      requirePermission(route.permission),
      ...(route.before?.(deps) ?? []),
      answer(route, deps),
    );
  return router;
}
