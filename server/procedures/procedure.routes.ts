import { z } from 'zod';
import { idSchema } from '../../shared/contract/common';
import { irradiationEventsSchema } from '../../shared/contract/irradiation-event';
import {
  patientSchema,
  procedureCountSchema,
  procedureFilterSchema,
  procedurePageSchema,
} from '../../shared/contract/procedure-row';
import { procedureMarkSchema, procedureSchema } from '../../shared/contract/procedure';
import { recordInputSchema, suggestedTeamSchema } from '../../shared/contract/record';
import { staffExposuresSchema } from '../../shared/contract/staff-exposure';
import { route, type Route } from '../http/route';
import { openExposures } from '../staff-exposure/open-exposures';
import { describeProcedure } from './describe-procedure';
import { listIrradiationEvents } from './list-irradiation-events';
import { countLedger, listLedger } from './list-procedures';
import { markProcedure } from './mark-procedure';
import { openProcedure } from './open-procedure';
import { saveRecord } from './save-record';
import { showPatient } from './show-patient';
import { suggestTeam } from './suggest-team';

const params = z.object({ id: idSchema });

export const procedureRoutes: Route[] = [
  route({
    method: 'get',
    path: '/procedures',
    permission: 'procedure.list',
    summary: 'The ledger, a page at a time',
    query: procedureFilterSchema,
    response: procedurePageSchema,
    handle: ({ deps, actor, query }) => listLedger(deps.db, actor, query, deps.now()),
  }),
  route({
    method: 'get',
    path: '/procedures/count',
    permission: 'procedure.list',
    summary: 'How many procedures a filter finds, and how many of them lack details',
    query: procedureFilterSchema,
    response: procedureCountSchema,
    handle: ({ deps, actor, query }) => countLedger(deps.db, actor, query, deps.now()),
  }),
  route({
    method: 'get',
    path: '/procedures/:id',
    permission: 'procedure.read',
    summary: 'One procedure',
    params,
    response: procedureSchema,
    handle: async ({ deps: { db }, actor, params: { id } }) =>
      describeProcedure(db, actor, await openProcedure(db, actor, id, 'procedure.read')),
  }),
  route({
    method: 'patch',
    path: '/procedures/:id',
    permission: 'procedure.complete',
    summary: 'Class, overlap of fields, withdrawal; with a reason',
    params,
    body: procedureMarkSchema,
    response: procedureSchema,
    handle: async ({ deps, actor, params: { id }, body }) =>
      describeProcedure(deps.db, actor, await markProcedure(deps.db, actor, id, body, deps.now())),
  }),
  route({
    method: 'get',
    path: '/procedures/:id/patient',
    permission: 'procedure.read-patient',
    summary: 'Who the patient is; audited',
    params,
    response: patientSchema,
    handle: async ({ deps: { db }, actor, params: { id } }) =>
      showPatient(db, actor, await openProcedure(db, actor, id, 'procedure.read-patient')),
  }),
  route({
    method: 'get',
    path: '/procedures/:id/irradiation-events',
    permission: 'procedure.read',
    summary: 'The irradiation events of a procedure',
    params,
    response: irradiationEventsSchema,
    handle: async ({ deps: { db }, actor, params: { id } }) => ({
      items: await listIrradiationEvents(db, await openProcedure(db, actor, id, 'procedure.read')),
    }),
  }),
  route({
    method: 'get',
    path: '/procedures/:id/staff-exposures',
    permission: 'procedure.read-exposure',
    summary: 'What scatter is estimated to have reached each person',
    params,
    response: staffExposuresSchema,
    handle: ({ deps, actor, params: { id } }) => openExposures(deps.db, actor, id),
  }),
  route({
    method: 'get',
    path: '/procedures/:id/suggested-team',
    permission: 'procedure.complete',
    summary: 'The team that last worked in the same room',
    params,
    response: suggestedTeamSchema,
    handle: async ({ deps: { db }, actor, params: { id } }) =>
      suggestTeam(db, await openProcedure(db, actor, id, 'procedure.complete')),
  }),
  route({
    method: 'put',
    path: '/procedures/:id/record',
    permission: 'procedure.complete',
    summary: 'Complete or correct the record',
    params,
    body: recordInputSchema,
    response: procedureSchema,
    handle: async ({ deps, actor, params: { id }, body }) =>
      describeProcedure(deps.db, actor, await saveRecord(deps.db, actor, id, body, deps.now())),
  }),
];
