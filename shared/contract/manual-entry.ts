import { z } from 'zod';
import { idSchema, optionalText, versionSchema } from './common';
import { planeSchema } from './report-parts';

export const typedQuantityNames = [
  'reference-air-kerma',
  'kerma-area-product',
  'fluoroscopy-time',
  'frame-count',
] as const;
export type TypedQuantityName = (typeof typedQuantityNames)[number];

/** A figure as it was typed, with the unit chosen beside it. */
export const typedQuantitySchema = z.object({
  quantity: z.enum(typedQuantityNames),
  plane: planeSchema,
  text: z.string().trim().min(1).max(20),
  unit: z.string().max(12),
});
export type TypedQuantity = z.infer<typeof typedQuantitySchema>;

/** A wall clock in the hospital: no offset, seconds may be left out. */
const wallClockSchema = z.iso
  .datetime({ local: true, error: 'Give the day and the time.' })
  .refine((text) => !text.endsWith('Z'), 'Give the local time.')
  .transform((text) => (text.length === 16 ? `${text}:00` : text));

const typed = {
  /** Null: a machine that is not in the register. */
  equipmentId: idSchema.nullable(),
  localStartedAt: wallClockSchema,
  quantities: z
    .array(typedQuantitySchema)
    .min(1, 'Type at least one figure.')
    .max(2 * typedQuantityNames.length),
  /** The large figures a second time, typed without a look at the first. */
  confirmation: z
    .array(typedQuantitySchema)
    .max(2 * typedQuantityNames.length)
    .default([]),
  photoId: idSchema.nullable(),
  comment: optionalText(500),
};

export const newManualEntrySchema = z.object({
  /** Made by the page when the form opens: the same one again is the same entry. */
  key: z.uuid(),
  /** A procedure that has no figures yet; null: a new one. */
  procedureId: idSchema.nullable(),
  ...typed,
  /** Where no machine is chosen. */
  roomId: idSchema.nullable(),
  procedureTypeId: idSchema.nullable(),
  patient: z.object({ id: optionalText(64), name: optionalText(120), accessionNumber: optionalText(64) }),
});
export type NewManualEntry = z.input<typeof newManualEntrySchema>;

/** Takes the place of an earlier entry, which stays readable. */
export const manualEntryCorrectionSchema = z.object({
  ...typed,
  reason: z.string().trim().min(3, 'Say why in a few words.').max(500),
  /** Of the procedure, as the person saw it. */
  version: versionSchema,
});
export type ManualEntryCorrection = z.input<typeof manualEntryCorrectionSchema>;

export const enteredSchema = z.object({ id: idSchema, procedureId: idSchema });
export type Entered = z.infer<typeof enteredSchema>;

export const manualEntrySchema = z.object({
  id: idSchema,
  equipmentId: idSchema.nullable(),
  localStartedAt: z.string(),
  quantities: z.array(typedQuantitySchema),
  photoId: idSchema.nullable(),
  /** May carry a name: absent for those who may not see the patient. */
  comment: z.string().nullable().optional(),
  /** Why it replaced the one before. */
  reason: z.string().nullable(),
  replacesId: idSchema.nullable(),
  /** Null where the reader may not see who worked on the record. */
  enteredBy: z.string().nullable(),
  enteredAt: z.string(),
  /** The newest of its line: its figures are those of the procedure. */
  isCurrent: z.boolean(),
});
export type ManualEntry = z.infer<typeof manualEntrySchema>;

/** Where and about when an entry says that the procedure was. */
export const neighbourQuerySchema = z.object({ equipment: idSchema, at: wallClockSchema });

/** A procedure of the same machine within an hour: perhaps the very one that is being typed. */
export const neighbourSchema = z.object({
  id: idSchema,
  caseNumber: z.string(),
  startedAt: z.string(),
  name: z.string().nullable(),
  isManual: z.boolean(),
});
export type Neighbour = z.infer<typeof neighbourSchema>;
