import type { Request } from 'express';
import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import {
  personChoiceSchema,
  personInputSchema,
  personSchema,
  savedPersonSchema,
} from '../../shared/contract/person';
import { route, type Route } from '../http/route';
import { invitePerson } from './invite-person';
import { listChoices, listPeople } from './person.store';
import { savePerson } from './save-person';

const params = z.object({ id: idSchema });

/** Links lead to the address by which the administrator reached this server. */
const originOf = (request: Request): string => `${request.protocol}://${request.get('host') ?? ''}`;

export const personRoutes: Route[] = [
  route({
    method: 'get',
    path: '/people',
    permission: 'person.edit',
    summary: 'The people, with their sign-ins and roles',
    response: listOf(personSchema),
    handle: async ({ deps, actor }) => ({ items: await listPeople(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'get',
    path: '/people/choices',
    permission: 'person.choose',
    summary: 'The people by name and job, for forms',
    response: listOf(personChoiceSchema),
    handle: async ({ deps, actor }) => ({ items: await listChoices(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'post',
    path: '/people',
    permission: 'person.edit',
    summary: 'Add a person; with an e-mail also a sign-in and a one-time link',
    body: personInputSchema,
    response: savedPersonSchema,
    status: 201,
    handle: ({ deps, actor, body, request }) =>
      savePerson(deps.db, actor, null, body, { now: deps.now(), origin: originOf(request) }),
  }),
  route({
    method: 'put',
    path: '/people/:id',
    permission: 'person.edit',
    summary: 'Edit a person, the sign-in and the roles',
    params,
    body: personInputSchema,
    response: savedPersonSchema,
    handle: ({ deps, actor, params: { id }, body, request }) =>
      savePerson(deps.db, actor, id, body, { now: deps.now(), origin: originOf(request) }),
  }),
  route({
    method: 'post',
    path: '/people/:id/invitation',
    permission: 'person.edit',
    summary: 'Make a new one-time link for choosing a password; it is told once',
    params,
    response: savedPersonSchema,
    status: 201,
    handle: ({ deps, actor, params: { id }, request }) =>
      invitePerson(deps.db, actor, id, { now: deps.now(), origin: originOf(request) }),
  }),
];
