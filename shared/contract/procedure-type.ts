import { z } from 'zod';
import { idSchema, requiredText, versionSchema } from './common';

export const bodyRegions = ['head', 'chest', 'abdomen', 'pelvis', 'extremity', 'other'] as const;

export const procedureTypeSchema = z.object({
  id: idSchema,
  key: z.string(),
  name: z.string(),
  bodyRegion: z.enum(bodyRegions),
  typicalKvp: z.number().nullable(),
  recognisedBy: z.array(z.string()),
  isActive: z.boolean(),
  version: versionSchema,
});
export type ProcedureType = z.infer<typeof procedureTypeSchema>;

export const procedureTypeInputSchema = z.object({
  key: requiredText(20),
  name: requiredText(120),
  bodyRegion: z.enum(bodyRegions),
  typicalKvp: z.number().min(40, 'Between 40 and 150 kV.').max(150, 'Between 40 and 150 kV.').nullable(),
  /** Words in the study description or protocol that suggest this type. */
  recognisedBy: z.array(requiredText(120)).max(40),
  isActive: z.boolean(),
  version: versionSchema.optional(),
});
export type ProcedureTypeInput = z.input<typeof procedureTypeInputSchema>;
