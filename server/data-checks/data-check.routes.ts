import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import {
  checkRecomputedSchema,
  checkRuleSchema,
  checkSettingInputSchema,
  endSettlementSchema,
  settlementInputSchema,
} from '../../shared/contract/data-check';
import { procedureSchema } from '../../shared/contract/procedure';
import { route, type Route } from '../http/route';
import { describeProcedure } from '../procedures/describe-procedure';
import { listCheckRules } from './list-check-rules';
import { askToRecompute } from './recompute-findings';
import { setCheckRule } from './set-check-rule';
import { settleFindings, takeSettlementBack } from './settle-findings';

const ofProcedure = z.object({ id: idSchema });
const ofRule = z.object({ code: z.string().max(60) });

export const dataCheckRoutes: Route[] = [
  route({
    method: 'get',
    path: '/data-checks',
    permission: 'data-check.list',
    summary: 'The rules that procedures are held against, with their settings and what is open',
    response: listOf(checkRuleSchema),
    handle: async ({ deps, actor }) => ({
      items: await listCheckRules(deps.db, actor.hospitalId, deps.now()),
    }),
  }),
  route({
    method: 'put',
    path: '/data-checks/:code',
    permission: 'data-check.edit',
    summary: 'Set severity, owner and bounds of a rule from a day on; earlier settings stay',
    params: ofRule,
    body: checkSettingInputSchema,
    response: checkRuleSchema,
    handle: ({ deps, actor, params: { code }, body }) => setCheckRule(deps.db, actor, code, body, deps.now()),
  }),
  route({
    method: 'post',
    path: '/data-checks/:code/recompute',
    permission: 'data-check.edit',
    summary: 'Compute again what has an open finding of a rule; done after the answer',
    params: ofRule,
    response: checkRecomputedSchema,
    handle: ({ deps, actor, params: { code } }) => askToRecompute(deps.db, actor, code),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/check-settlements',
    permission: 'data-check.settle',
    summary: 'Decide about findings of a procedure: right, corrected, or left out',
    params: ofProcedure,
    body: settlementInputSchema,
    response: procedureSchema,
    status: 201,
    handle: async ({ deps, actor, params: { id }, body }) =>
      describeProcedure(deps.db, actor, await settleFindings(deps.db, actor, id, body, deps.now())),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/check-settlements/:settlementId/end',
    permission: 'data-check.settle',
    summary: 'Take a decision about a finding back; it stays readable',
    params: ofProcedure.extend({ settlementId: idSchema }),
    body: endSettlementSchema,
    response: procedureSchema,
    handle: async ({ deps, actor, params: { id, settlementId }, body }) =>
      describeProcedure(
        deps.db,
        actor,
        await takeSettlementBack(deps.db, actor, id, settlementId, body, deps.now()),
      ),
  }),
];
