import { z } from 'zod';
import {
  calibrationFactorInputSchema,
  calibrationFactorSchema,
} from '../../shared/contract/calibration-factor';
import { idSchema, listOf } from '../../shared/contract/common';
import {
  equipmentChoiceSchema,
  equipmentInputSchema,
  equipmentSchema,
  newEquipmentSchema,
} from '../../shared/contract/equipment';
import { route, type Route } from '../http/route';
import { enterCalibrationFactor, listFactorsOfEquipment } from './enter-calibration-factor';
import { listEquipment, listEquipmentChoices } from './equipment.store';
import { addKnownEquipment, saveEquipment } from './save-equipment';

const params = z.object({ id: idSchema });

export const equipmentRoutes: Route[] = [
  route({
    method: 'get',
    path: '/equipment',
    permission: 'equipment.edit',
    summary: 'The machines, those without a room first',
    response: listOf(equipmentSchema),
    handle: async ({ deps, actor }) => ({ items: await listEquipment(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'get',
    path: '/equipment/choices',
    permission: 'procedure.enter-by-hand',
    summary: 'The machines by name and room, for those who choose one',
    response: listOf(equipmentChoiceSchema),
    handle: async ({ deps, actor }) => ({ items: await listEquipmentChoices(deps.db, actor.hospitalId) }),
  }),
  route({
    method: 'post',
    path: '/equipment',
    permission: 'equipment.edit',
    summary: 'Add a machine before its first report',
    body: newEquipmentSchema,
    response: equipmentSchema,
    status: 201,
    handle: ({ deps, actor, body }) => addKnownEquipment(deps.db, actor, body),
  }),
  route({
    method: 'put',
    path: '/equipment/:id',
    permission: 'equipment.edit',
    summary: 'Edit a machine; procedures of it that have no room follow it to its room',
    params,
    body: equipmentInputSchema,
    response: equipmentSchema,
    handle: ({ deps, actor, params: { id }, body }) => saveEquipment(deps.db, actor, id, body),
  }),
  route({
    method: 'get',
    path: '/equipment/:id/calibration-factors',
    permission: 'calibration.edit',
    summary: 'Every calibration factor of a machine, the newest first',
    params,
    response: listOf(calibrationFactorSchema),
    handle: async ({ deps, actor, params: { id } }) => ({
      items: await listFactorsOfEquipment(deps.db, actor, id),
    }),
  }),
  route({
    method: 'post',
    path: '/calibration-factors',
    permission: 'calibration.edit',
    summary: 'Add a dated calibration factor; none is ever changed',
    body: calibrationFactorInputSchema,
    response: calibrationFactorSchema,
    status: 201,
    handle: ({ deps, actor, body }) => enterCalibrationFactor(deps.db, actor, body),
  }),
];
