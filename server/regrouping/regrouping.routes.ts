import { z } from 'zod';
import { idSchema } from '../../shared/contract/common';
import {
  candidateFilterSchema,
  candidatesSchema,
  mergeInputSchema,
  moveInputSchema,
  previewInputSchema,
  previewSchema,
  regroupedSchema,
  regroupingsSchema,
  splitInputSchema,
  takeBackInputSchema,
} from '../../shared/contract/regrouping';
import { route, type Route } from '../http/route';
import { openProcedure } from '../procedures/open-procedure';
import { doRegrouping } from './do-regrouping';
import { describeCandidates } from './list-candidates';
import { describeRegroupings } from './list-regroupings';
import { previewRegrouping } from './preview-regrouping';
import { takeBack } from './take-back';

const params = z.object({ id: idSchema });
const permission = 'procedure.regroup';

export const regroupingRoutes: Route[] = [
  route({
    method: 'get',
    path: '/procedures/:id/regroupings',
    permission,
    summary: 'What was merged, split or moved to or from a procedure',
    params,
    response: regroupingsSchema,
    handle: async ({ deps: { db }, actor, params: { id } }) => ({
      items: await describeRegroupings(db, await openProcedure(db, actor, id, permission)),
    }),
  }),
  route({
    method: 'get',
    path: '/procedures/:id/regroup-candidates',
    permission,
    summary: 'Procedures that its reports may belong to, or those of a case number',
    params,
    query: candidateFilterSchema,
    response: candidatesSchema,
    handle: async ({ deps: { db }, actor, params: { id }, query }) => ({
      items: await describeCandidates(db, await openProcedure(db, actor, id, permission), query.find || null),
    }),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/regroup-preview',
    permission,
    summary: 'Events and totals before and after; nothing is changed',
    params,
    body: previewInputSchema,
    response: previewSchema,
    handle: ({ deps, actor, params: { id }, body }) =>
      previewRegrouping(deps.db, actor, id, body, deps.now()),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/merge',
    permission,
    summary: 'Take all reports of this procedure into another one',
    params,
    body: mergeInputSchema,
    response: regroupedSchema,
    handle: ({ deps, actor, params: { id }, body: { reason, version, targetId, targetVersion } }) =>
      doRegrouping(
        deps.db,
        actor,
        {
          kind: 'merge',
          source: { id, version },
          target: { id: targetId, version: targetVersion },
          doseReportIds: [],
        },
        reason,
        deps.now(),
      ),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/split',
    permission,
    summary: 'Give some reports of this procedure a procedure of their own',
    params,
    body: splitInputSchema,
    response: regroupedSchema,
    handle: ({ deps, actor, params: { id }, body: { reason, version, doseReportIds } }) =>
      doRegrouping(
        deps.db,
        actor,
        { kind: 'split', source: { id, version }, target: null, doseReportIds },
        reason,
        deps.now(),
      ),
  }),
  route({
    method: 'post',
    path: '/procedures/:id/move',
    permission,
    summary: 'Take some reports of this procedure into another one',
    params,
    body: moveInputSchema,
    response: regroupedSchema,
    handle: ({
      deps,
      actor,
      params: { id },
      body: { reason, version, targetId, targetVersion, doseReportIds },
    }) =>
      doRegrouping(
        deps.db,
        actor,
        {
          kind: 'move',
          source: { id, version },
          target: { id: targetId, version: targetVersion },
          doseReportIds,
        },
        reason,
        deps.now(),
      ),
  }),
  route({
    method: 'post',
    path: '/regroupings/:id/undo',
    permission,
    summary: 'Take a merge, split or move back',
    params,
    body: takeBackInputSchema,
    response: regroupedSchema,
    handle: ({ deps, actor, params: { id }, body }) => takeBack(deps.db, actor, id, body, deps.now()),
  }),
];
