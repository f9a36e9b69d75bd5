import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import { procedureTypeInputSchema, procedureTypeSchema } from '../../shared/contract/procedure-type';
import { route, type Route } from '../http/route';
import { listProcedureTypes } from './procedure-type.store';
import { saveProcedureType } from './save-procedure-type';

export const procedureTypeRoutes: Route[] = [
  route({
    method: 'get',
    path: '/procedure-types',
    permission: 'procedure-type.list',
    summary: 'The procedure types',
    response: listOf(procedureTypeSchema),
    handle: async ({ deps, actor }) => ({ items: await listProcedureTypes(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'post',
    path: '/procedure-types',
    permission: 'procedure-type.edit',
    summary: 'Add a procedure type',
    body: procedureTypeInputSchema,
    response: procedureTypeSchema,
    status: 201,
    handle: ({ deps, actor, body }) => saveProcedureType(deps.db, actor, null, body),
  }),
  route({
    method: 'put',
    path: '/procedure-types/:id',
    permission: 'procedure-type.edit',
    summary: 'Edit a procedure type',
    params: z.object({ id: idSchema }),
    body: procedureTypeInputSchema,
    response: procedureTypeSchema,
    handle: ({ deps, actor, params: { id }, body }) => saveProcedureType(deps.db, actor, id, body),
  }),
];
