import { z } from 'zod';
import { idSchema } from '../../shared/contract/common';
import { conflictSchema, decidedSchema, decideInputSchema } from '../../shared/contract/decide-report';
import { route, type Route } from '../http/route';
import { describeConflict } from './decide-comparison';
import { decideConflict } from './decide-conflict';

const params = z.object({ id: idSchema });

export const decideReportRoutes: Route[] = [
  route({
    method: 'get',
    path: '/dose-reports/:id/conflict',
    permission: 'dose-report.decide',
    summary: 'A held report beside the stored one that has its identity',
    params,
    response: conflictSchema,
    handle: ({ deps, actor, params: { id } }) => describeConflict(deps.db, actor, id),
  }),
  route({
    method: 'post',
    path: '/dose-reports/:id/decide',
    permission: 'dose-report.decide',
    summary: 'Say which of two reports with one identity counts',
    params,
    body: decideInputSchema,
    response: decidedSchema,
    handle: ({ deps, actor, params: { id }, body }) => decideConflict(deps.db, actor, id, body, deps.now()),
  }),
];
