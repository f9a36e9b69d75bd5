import { z } from 'zod';
import { roles } from '../permissions';
import { idSchema, optionalText, requiredText, versionSchema } from './common';

export const jobs = [
  'interventional-radiologist',
  'interventional-cardiologist',
  'electrophysiologist',
  'neuro-interventionalist',
  'other-physician',
  'anaesthetist',
  'nurse',
  'technologist',
  'physicist',
  'administration',
  'other',
] as const;
export type Job = (typeof jobs)[number];

export const jobNames: Record<Job, string> = {
  'interventional-radiologist': 'Interventional radiologist',
  'interventional-cardiologist': 'Interventional cardiologist',
  electrophysiologist: 'Electrophysiologist',
  'neuro-interventionalist': 'Neuro-interventionalist',
  'other-physician': 'Physician',
  anaesthetist: 'Anaesthetist',
  nurse: 'Nurse',
  technologist: 'Technologist',
  physicist: 'Medical physicist',
  administration: 'Administration',
  other: 'Other staff',
};

/** What the record form needs to offer people; no e-mail, no roles. */
export const personChoiceSchema = z.object({
  id: idSchema,
  name: z.string(),
  job: z.enum(jobs),
  isActive: z.boolean(),
});
export type PersonChoice = z.infer<typeof personChoiceSchema>;

export const personSchema = personChoiceSchema.extend({
  statureM: z.number().nullable(),
  isMonitored: z.boolean(),
  email: z.string().nullable(),
  roles: z.array(z.enum(roles)),
  hasPassword: z.boolean(),
  version: versionSchema,
});
export type Person = z.infer<typeof personSchema>;

export const personInputSchema = z.object({
  name: requiredText(120),
  job: z.enum(jobs),
  statureM: z.number().min(1.2, 'Between 1.20 and 2.30 m.').max(2.3, 'Between 1.20 and 2.30 m.').nullable(),
  isMonitored: z.boolean(),
  isActive: z.boolean(),
  email: optionalText(254).pipe(z.email('Write an e-mail address.').nullable()),
  roles: z.array(z.enum(roles)),
  version: versionSchema.optional(),
});
export type PersonInput = z.input<typeof personInputSchema>;

/** A person with an e-mail gets a one-time link to choose a password; it is shown once. */
export const savedPersonSchema = z.object({ person: personSchema, invitationUrl: z.string().nullable() });
export type SavedPerson = z.infer<typeof savedPersonSchema>;
