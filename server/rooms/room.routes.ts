import { z } from 'zod';
import { idSchema, listOf } from '../../shared/contract/common';
import { roomInputSchema, roomSchema } from '../../shared/contract/room';
import { route, type Route } from '../http/route';
import { listRooms } from './room.store';
import { saveRoom } from './save-room';

const params = z.object({ id: idSchema });

export const roomRoutes: Route[] = [
  route({
    method: 'get',
    path: '/rooms',
    permission: 'room.list',
    summary: 'The rooms',
    response: listOf(roomSchema),
    handle: async ({ deps, actor }) => ({ items: await listRooms(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'post',
    path: '/rooms',
    permission: 'room.edit',
    summary: 'Add a room',
    body: roomInputSchema,
    response: roomSchema,
    status: 201,
    handle: ({ deps, actor, body }) => saveRoom(deps.db, actor, null, body),
  }),
  route({
    method: 'put',
    path: '/rooms/:id',
    permission: 'room.edit',
    summary: 'Edit a room',
    params,
    body: roomInputSchema,
    response: roomSchema,
    handle: ({ deps, actor, params: { id }, body }) => saveRoom(deps.db, actor, id, body),
  }),
];
