import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import {
  enteredSchema,
  manualEntryCorrectionSchema,
  manualEntrySchema,
  neighbourQuerySchema,
  neighbourSchema,
  newManualEntrySchema,
} from '../../shared/contract/manual-entry';
import { route, type Route } from '../http/route';
import { openProcedure } from '../procedures/open-procedure';
import { correctEntry } from './correct-entry';
import { enterByHand } from './enter-by-hand';
import { findNeighbours } from './find-neighbours';
import { listEntries } from './list-entries';
import { showPhoto } from './show-photo';

const params = z.object({ id: idSchema });

export const manualEntryRoutes: Route[] = [
  route({
    method: 'post',
    path: '/manual-entries',
    permission: 'procedure.enter-by-hand',
    summary: 'Enter what a machine without a report showed; the same key again is the same entry',
    body: newManualEntrySchema,
    response: enteredSchema,
    status: 201,
    handle: ({ deps, actor, body }) => enterByHand(deps.db, actor, body, deps.now()),
  }),
  route({
    method: 'get',
    path: '/manual-entries/neighbours',
    permission: 'procedure.enter-by-hand',
    summary: 'Procedures of the same machine within an hour of a start',
    query: neighbourQuerySchema,
    response: listOf(neighbourSchema),
    handle: async ({ deps, actor, query }) => ({ items: await findNeighbours(deps.db, actor, query) }),
  }),
  route({
    method: 'post',
    path: '/manual-entries/:id/corrections',
    permission: 'procedure.enter-by-hand',
    summary: 'Put another entry in the place of this one, with a reason; this one stays readable',
    params,
    body: manualEntryCorrectionSchema,
    response: enteredSchema,
    status: 201,
    handle: ({ deps, actor, params: { id }, body }) => correctEntry(deps.db, actor, id, body, deps.now()),
  }),
  route({
    method: 'get',
    path: '/manual-entries/:id/photo',
    permission: 'procedure.read-patient',
    summary: 'The picture of the dose screen; audited',
    params,
    handle: async ({ deps, actor, params: { id }, response }) => {
      const { mediaType, bytes } = await showPhoto(deps.db, actor, id);
      response
        .set({
          'Content-Disposition': `inline; filename="dose-screen.${mediaType.slice('image/'.length)}"`,
          'Content-Security-Policy': "default-src 'none'; sandbox",
        })
        .type(mediaType)
        .send(bytes);
    },
  }),
  route({
    method: 'get',
    path: '/procedures/:id/manual-entries',
    permission: 'procedure.read',
    summary: 'What was entered by hand for a procedure, to the letter, the newest first',
    params,
    response: listOf(manualEntrySchema),
    handle: async ({ deps: { db }, actor, params: { id } }) => ({
      items: await listEntries(db, actor, await openProcedure(db, actor, id, 'procedure.read')),
    }),
  }),
];
