import { z } from 'zod';
import { roles } from '../permissions';
import { idSchema, requiredText } from './common';

export const signInSchema = z.object({
  email: z.email('Write an e-mail address.').max(254),
  password: z.string().min(1, 'Fill this in.').max(1024),
});
export type SignIn = z.infer<typeof signInSchema>;

export const userSchema = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  job: z.string(),
  roles: z.array(z.enum(roles)),
});
export type User = z.infer<typeof userSchema>;

/** Signed out is an answer, not an error. */
export const sessionSchema = z.object({
  user: userSchema.nullable(),
  hospital: z.object({ name: z.string(), timeZone: z.string(), isDemo: z.boolean() }).nullable(),
});
export type Session = z.infer<typeof sessionSchema>;

export const newPasswordSchema = z.string().min(12, 'Use at least 12 characters.').max(1024);

/** A one-time link: makes the first administrator, or lets an invited person choose a password. */
export const useLinkSchema = z.object({
  token: z.string().min(20).max(200),
  password: newPasswordSchema,
  hospitalName: requiredText(120).optional(),
  timeZone: requiredText(60).optional(),
  name: requiredText(120).optional(),
  email: z.email('Write an e-mail address.').max(254).optional(),
});
export type UseLink = z.infer<typeof useLinkSchema>;

export const linkSchema = z.object({
  purpose: z.enum(['first-administrator', 'invitation']),
  email: z.string().nullable(),
  name: z.string().nullable(),
});
export type SignInLink = z.infer<typeof linkSchema>;
