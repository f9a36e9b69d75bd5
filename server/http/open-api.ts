import { z } from 'zod';
import { problemSchema } from '../../shared/contract/problem';
import type { Route } from './route';

const jsonSchema = (schema: z.ZodType, io: 'input' | 'output') =>
  z.toJSONSchema(schema, { target: 'draft-2020-12', unrepresentable: 'any', io, reused: 'inline' });

const json = (schema: unknown, type = 'application/json') => ({ content: { [type]: { schema } } });

type ObjectSchema = { properties?: Record<string, unknown>; required?: string[] };

function parameters(schema: z.ZodType | undefined, place: 'path' | 'query') {
  if (!schema) return [];
  const { properties = {}, required = [] } = jsonSchema(schema, 'input') as ObjectSchema;
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
  }));
}

function requestBody(route: Route) {
  if (route.multipart) {
    const files = {
      type: 'array',
      minItems: 1,
      items: { type: 'string', contentMediaType: 'application/octet-stream' },
    };
    const schema = { type: 'object', properties: { [route.multipart]: files }, required: [route.multipart] };
    return json(schema, 'multipart/form-data');
  }
  return route.body && json(jsonSchema(route.body, 'input'));
}

function operation(route: Route) {
  const success = route.response
    ? { [route.status ?? 200]: { description: 'Done', ...json(jsonSchema(route.response, 'output')) } }
    : { [route.status ?? 204]: { description: 'Done' } };
  return {
    summary: route.summary,
    'x-permission': route.permission,
    parameters: [...parameters(route.params, 'path'), ...parameters(route.query, 'query')],
    ...(requestBody(route) ? { requestBody: requestBody(route) } : {}),
    responses: {
      ...success,
      default: {
        description: 'Problem',
        ...json(jsonSchema(problemSchema, 'output'), 'application/problem+json'),
      },
    },
    ...(route.permission === 'public' ? { security: [] } : {}),
  };
}

/** The OpenAPI 3.1 document, made from the schemas that the server itself parses with. */
export function describeApi(routes: Route[], version: string) {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const path = `/api${route.path.replace(/:(\w+)/g, '{$1}')}`;
    paths[path] = { ...paths[path], [route.method]: operation(route) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Leeward', version },
    paths,
    components: { securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'leeward.session' } } },
    security: [{ session: [] }],
  };
}
