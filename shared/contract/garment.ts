import { z } from 'zod';
import { calendarDateSchema, idSchema, optionalText, requiredText, versionSchema } from './common';

export const garmentKinds = [
  'vest-and-skirt',
  'one-piece',
  'thyroid-collar',
  'glasses',
  'cap',
  'gloves',
  'ceiling-screen',
  'table-skirt',
  'mobile-screen',
] as const;
export type GarmentKind = (typeof garmentKinds)[number];

export const garmentKindNames: Record<GarmentKind, string> = {
  'vest-and-skirt': 'Vest and skirt',
  'one-piece': 'One-piece apron',
  'thyroid-collar': 'Thyroid collar',
  glasses: 'Lead glasses',
  cap: 'Cap',
  gloves: 'Gloves',
  'ceiling-screen': 'Ceiling screen',
  'table-skirt': 'Table skirt',
  'mobile-screen': 'Mobile screen',
};

export const garmentMaterials = ['lead', 'lead-composite', 'lead-free'] as const;
export const garmentStates = ['in-service', 'withdrawn', 'discarded', 'lost'] as const;

export const garmentSchema = z.object({
  id: idSchema,
  code: z.string(),
  kind: z.enum(garmentKinds),
  material: z.enum(garmentMaterials),
  frontLeadMm: z.number().nullable(),
  backLeadMm: z.number().nullable(),
  leadKvp: z.number().nullable(),
  isMeasured: z.boolean(),
  owner: z.object({ id: idSchema, name: z.string() }).nullable(),
  state: z.enum(garmentStates),
  lastInspectedOn: calendarDateSchema.nullable(),
  nextDueOn: calendarDateSchema.nullable(),
  isOverdue: z.boolean(),
  note: z.string().nullable(),
  version: versionSchema,
});
export type Garment = z.infer<typeof garmentSchema>;

const leadMm = z.number().min(0, 'Between 0 and 3 mm.').max(3, 'Between 0 and 3 mm.').nullable();

export const garmentInputSchema = z.object({
  code: requiredText(40),
  kind: z.enum(garmentKinds),
  material: z.enum(garmentMaterials),
  frontLeadMm: leadMm,
  backLeadMm: leadMm,
  leadKvp: z.number().min(40, 'Between 40 and 150 kV.').max(150, 'Between 40 and 150 kV.').nullable(),
  isMeasured: z.boolean(),
  ownerId: idSchema.nullable(),
  state: z.enum(garmentStates),
  lastInspectedOn: calendarDateSchema.nullable(),
  nextDueOn: calendarDateSchema.nullable(),
  note: optionalText(500),
  version: versionSchema.optional(),
});
export type GarmentInput = z.input<typeof garmentInputSchema>;
