import { z } from 'zod';
import { idSchema, namedSchema, optionalText, versionSchema } from './common';
import { missingParts, type MissingPart } from './procedure-row';

/** What somebody does in the room. The record says who did, where they stood and what they wore: no file tells it. */
export const duties = [
  'primary-operator',
  'second-operator',
  'trainee',
  'scrub',
  'anaesthesia',
  'circulating',
  'technologist',
  'other',
] as const;
export type Duty = (typeof duties)[number];

export const dutyNames: Record<Duty, string> = {
  'primary-operator': 'Operator',
  'second-operator': 'Second operator',
  trainee: 'Trainee',
  scrub: 'Scrub',
  anaesthesia: 'Anaesthesia',
  circulating: 'Circulating',
  technologist: 'Technologist',
  other: 'Other',
};

export const positionPresets = [
  'operator',
  'second-operator',
  'scrub',
  'anaesthesia',
  'circulating',
  'technologist',
  'jugular-access',
  'left-chest',
  'control-room',
] as const;
export type PositionPreset = (typeof positionPresets)[number];

export const positionPresetNames: Record<PositionPreset, string> = {
  operator: 'Operator',
  'second-operator': 'Second operator',
  scrub: 'Scrub',
  anaesthesia: 'Anaesthesia',
  circulating: 'Circulating',
  technologist: 'Technologist, in the room',
  'jugular-access': 'Jugular access',
  'left-chest': 'Left chest',
  'control-room': 'Control room',
};

/** Metres from the isocentre: +x the patient's left, +y the head. A moved preset keeps its coordinates only. */
export const placeSchema = z.object({
  preset: z.enum(positionPresets).nullable(),
  xM: z.number().min(-6, 'Within 6 m.').max(6, 'Within 6 m.'),
  yM: z.number().min(-6, 'Within 6 m.').max(6, 'Within 6 m.'),
  isBehindBarrier: z.boolean(),
});
export type Place = z.infer<typeof placeSchema>;

export const garmentAnswers = ['worn', 'none', 'unknown', 'unanswered'] as const;

export const presenceSchema = z
  .object({
    personId: idSchema.nullable(),
    /** Somebody who is not in the register. */
    visitorName: optionalText(120),
    duty: z.enum(duties),
    fluoroscopyPlace: placeSchema.nullable(),
    acquisitionPlace: placeSchema.nullable(),
    isTurnedAway: z.boolean().default(false),
    isPresentDuringRotation: z.boolean().default(false),
    garmentAnswer: z.enum(garmentAnswers),
    garmentId: idSchema.nullable(),
    hasThyroidCollar: z.boolean().nullable(),
    hasGlasses: z.boolean().default(false),
    hasCeilingScreen: z.boolean().default(false),
    hasTableSkirt: z.boolean().default(false),
    hasMobileScreen: z.boolean().default(false),
    presentFromS: z.number().min(0).nullable().default(null),
    presentToS: z.number().min(0).nullable().default(null),
  })
  .refine((presence) => presence.personId !== null || presence.visitorName !== null, {
    path: ['personId'],
    message: 'Choose a person or write a name.',
  })
  .refine((presence) => presence.garmentAnswer !== 'worn' || presence.garmentId !== null, {
    path: ['garmentId'],
    message: 'Choose the garment.',
  });
export type Presence = z.infer<typeof presenceSchema>;

export const accessSides = ['right', 'left', 'head'] as const;

const recordFields = {
  procedureTypeId: idSchema.nullable(),
  primaryOperatorId: idSchema.nullable(),
  secondOperatorId: idSchema.nullable(),
  traineeId: idSchema.nullable(),
  accessSide: z.enum(accessSides).nullable(),
  isFeetFirst: z.boolean().nullable(),
  isProne: z.boolean().nullable(),
  isEmergency: z.boolean().nullable(),
  patientHeightM: z
    .number()
    .min(0.3, 'Between 0.30 and 2.50 m.')
    .max(2.5, 'Between 0.30 and 2.50 m.')
    .nullable(),
  patientWeightKg: z
    .number()
    .min(0.5, 'Between 0.5 and 400 kg.')
    .max(400, 'Between 0.5 and 400 kg.')
    .nullable(),
  presences: z.array(presenceSchema).max(30),
};

export const recordInputSchema = z.object({
  ...recordFields,
  version: versionSchema,
  /** Why a complete record is corrected. */
  reason: optionalText(500),
});
export type RecordInput = z.input<typeof recordInputSchema>;

export const missingPartNames: Record<MissingPart, string> = {
  'procedure-type': 'procedure type',
  operator: 'operator',
  person: 'staff in the room',
  place: 'a place',
  garment: 'a garment answer',
};

export const recordSchema = z.object({
  ...recordFields,
  version: versionSchema,
  state: z.enum(['incomplete', 'complete']),
  missing: z.array(z.enum(missingParts)),
  /** Fields that the file filled; a person may overrule them. */
  fromFile: z.array(z.string()),
  people: z.array(namedSchema),
});
export type ProcedureRecord = z.infer<typeof recordSchema>;

/** The team that last worked in the same room on the same type, to start from. */
export const suggestedTeamSchema = z.object({
  fromCaseNumber: z.string().nullable(),
  procedureTypeId: idSchema.nullable(),
  presences: z.array(presenceSchema),
});
export type SuggestedTeam = z.infer<typeof suggestedTeamSchema>;
