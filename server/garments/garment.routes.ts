import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import { garmentInputSchema, garmentSchema } from '../../shared/contract/garment';
import { route, type Route } from '../http/route';
import { saveGarment } from './save-garment';
import { showGarments } from './show-garments';

export const garmentRoutes: Route[] = [
  route({
    method: 'get',
    path: '/garments',
    permission: 'garment.list',
    summary: 'The garments that the person may see: all, all without names, or own',
    response: listOf(garmentSchema),
    handle: async ({ deps, actor }) => ({ items: await showGarments(deps.db, actor, deps.now()) }),
  }),
  route({
    method: 'post',
    path: '/garments',
    permission: 'garment.edit',
    summary: 'Add a garment',
    body: garmentInputSchema,
    response: garmentSchema,
    status: 201,
    handle: ({ deps, actor, body }) => saveGarment(deps.db, actor, null, body, deps.now()),
  }),
  route({
    method: 'put',
    path: '/garments/:id',
    permission: 'garment.edit',
    summary: 'Edit a garment',
    params: z.object({ id: idSchema }),
    body: garmentInputSchema,
    response: garmentSchema,
    handle: ({ deps, actor, params: { id }, body }) => saveGarment(deps.db, actor, id, body, deps.now()),
  }),
];
