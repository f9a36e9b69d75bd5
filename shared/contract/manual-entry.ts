import { z } from 'zod';
import { planeSchema } from './report-parts';

export const typedQuantityNames = [
  'reference-air-kerma',
  'kerma-area-product',
  'fluoroscopy-time',
  'frame-count',
] as const;

/** A figure as it was typed, with the unit chosen beside it. */
export const typedQuantitySchema = z.object({
  quantity: z.enum(typedQuantityNames),
  plane: planeSchema,
  text: z.string().trim().min(1).max(20),
  unit: z.string().max(12),
});
export type TypedQuantity = z.infer<typeof typedQuantitySchema>;
