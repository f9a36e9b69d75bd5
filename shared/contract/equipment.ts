import { z } from 'zod';
import { calendarDateSchema, idSchema, namedSchema, requiredText, versionSchema } from './common';

export const tubePositions = ['under-table', 'over-table'] as const;

/** A machine makes itself known by its first report; a person gives it a room. */
export const equipmentSchema = z.object({
  id: idSchema,
  roomId: idSchema.nullable(),
  manufacturer: z.string().nullable(),
  modelName: z.string().nullable(),
  serialNumber: z.string().nullable(),
  stationName: z.string().nullable(),
  label: z.string(),
  tubePosition: z.enum(tubePositions),
  inServiceFrom: calendarDateSchema.nullable(),
  inServiceTo: calendarDateSchema.nullable(),
  reportCount: z.int(),
  version: versionSchema,
});
export type Equipment = z.infer<typeof equipmentSchema>;

/** A machine as far as those need it who choose one. */
export const equipmentChoiceSchema = equipmentSchema.pick({ id: true, label: true }).extend({
  room: namedSchema.nullable(),
  /** Its latest procedure had planes A and B. */
  isBiplane: z.boolean(),
});
export type EquipmentChoice = z.infer<typeof equipmentChoiceSchema>;

export const equipmentInputSchema = z.object({
  label: requiredText(120),
  roomId: idSchema.nullable(),
  tubePosition: z.enum(tubePositions),
  inServiceFrom: calendarDateSchema.nullable(),
  inServiceTo: calendarDateSchema.nullable(),
  version: versionSchema,
});
export type EquipmentInput = z.input<typeof equipmentInputSchema>;

/** Entered by hand before the machine's first report; recognised by the same four fields. */
export const newEquipmentSchema = equipmentInputSchema.omit({ version: true }).extend({
  manufacturer: requiredText(120),
  modelName: requiredText(120),
  serialNumber: requiredText(64),
  stationName: requiredText(64).nullable(),
});
export type NewEquipment = z.input<typeof newEquipmentSchema>;
