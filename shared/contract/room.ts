import { z } from 'zod';
import { idSchema, optionalText, requiredText, versionSchema } from './common';

export const roomSchema = z.object({
  id: idSchema,
  code: z.string(),
  name: z.string(),
  note: z.string().nullable(),
  isActive: z.boolean(),
  version: versionSchema,
});
export type Room = z.infer<typeof roomSchema>;

export const roomInputSchema = z.object({
  code: requiredText(20),
  name: requiredText(120),
  note: optionalText(500),
  isActive: z.boolean(),
  version: versionSchema.optional(),
});
export type RoomInput = z.input<typeof roomInputSchema>;
