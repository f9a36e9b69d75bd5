import { z } from 'zod';

export const measured = z.number().nullable();
export const optionalText = z.string().nullable();
const text = optionalText;

/** Code value, coding scheme designator and meaning as the file gives them. */
export const codeSchema = z.object({ value: z.string(), scheme: z.string(), meaning: z.string() });
export type Code = z.infer<typeof codeSchema>;

/** The decimal strings of a quantity and the unit's code, to the letter; one string for each value. */
export const reportedQuantitySchema = z.object({ text: z.array(z.string()), unit: text });
export type ReportedQuantity = z.infer<typeof reportedQuantitySchema>;
export const reported = z.record(z.string(), reportedQuantitySchema);

/** Why a number is empty (CID 42, "Not a number", "Measurement failure"), by the field it belongs to. */
export const qualifiers = z.record(z.string(), codeSchema);
export type Qualifiers = z.infer<typeof qualifiers>;

/**
 * Numbers given in binary or as a fraction beside their decimal strings, by field, in the unit of `reported`; the
 * decimal string stays the value (PS3.3 C.18.1).
 */
export const preciseValues = z.record(z.string(), z.array(z.number()));
export type PreciseValues = z.infer<typeof preciseValues>;

/**
 * A content item whose concept is of a public terminology but of no template known here: kept as written, so that
 * nothing the machine states is lost, and never counted as anything else.
 */
export const furtherItemSchema = z.object({
  concept: codeSchema,
  code: codeSchema.nullable(),
  text: z.array(z.string()),
  unit: text,
});
export type FurtherItem = z.infer<typeof furtherItemSchema>;

/** An IMAGE item: what it refers to; no frames means all of them. */
export const imageReferenceSchema = z.object({
  sopClassUid: text,
  sopInstanceUid: text,
  frameNumbers: z.array(z.number()),
});
export type ImageReference = z.infer<typeof imageReferenceSchema>;

export const planes = ['single', 'A', 'B', 'all'] as const;
export const planeSchema = z.enum(planes);
export type Plane = z.infer<typeof planeSchema>;

/** Where K a,r is defined: a code of CID 10025, or the device's own words. */
export const referencePointSchema = z.object({ code: codeSchema.nullable(), text });
export type ReferencePoint = z.infer<typeof referencePointSchema>;

/** TID 1021. */
export const deviceParticipantSchema = z.object({
  role: codeSchema.nullable(),
  name: text,
  manufacturer: text,
  modelName: text,
  serialNumber: text,
  observerUid: text,
});
export type DeviceParticipant = z.infer<typeof deviceParticipantSchema>;

export const personParticipantSchema = z.object({
  name: text,
  role: codeSchema.nullable(),
  id: text,
  idIssuer: text,
  organization: text,
  organizationRole: codeSchema.nullable(),
});
export type PersonParticipant = z.infer<typeof personParticipantSchema>;

/** TID 1002 with 1003 or 1004. */
export const observerSchema = z.object({
  type: z.enum(['person', 'device']).nullable(),
  uid: text,
  name: text,
  manufacturer: text,
  modelName: text,
  serialNumber: text,
  organization: text,
  role: codeSchema.nullable(),
  /** A device's, where it stood. */
  location: text,
  deviceRoles: z.array(codeSchema),
  /** A person's. */
  loginName: text,
  organizationRole: codeSchema.nullable(),
  /** Identifier within the role, such as a staff number. */
  roleIdentifier: text,
});
export type Observer = z.infer<typeof observerSchema>;
