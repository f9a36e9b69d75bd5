import { z } from 'zod';
import { calendarDateSchema, idSchema, requiredText } from './common';

export const calibratedQuantities = ['reference-air-kerma', 'kerma-area-product'] as const;
export const calibratedPlanes = ['single', 'A', 'B'] as const;

/**
 * True over displayed of a display that keeps within 35 % of the true value (IEC 60601-2-43, from memory):
 * 1/1.35 = 0.74 when it shows 35 % too much, 1/0.65 = 1.54 when it shows 35 % too little.
 */
export const expectedFactorRange = { low: 1 / 1.35, high: 1 / 0.65 } as const;

export const isExpectedFactor = (factor: number): boolean =>
  factor >= expectedFactorRange.low && factor <= expectedFactorRange.high;

/** True over displayed, for one plane of one machine, from a date on. Never edited: a newer row follows. */
export const calibrationFactorSchema = z.object({
  id: idSchema,
  equipmentId: idSchema,
  plane: z.enum(calibratedPlanes),
  quantity: z.enum(calibratedQuantities),
  factor: z.number(),
  uncertaintyPercent: z.number().nullable(),
  validFrom: calendarDateSchema,
  source: z.string(),
  enteredBy: z.string(),
  enteredAt: z.string(),
  /** The machine's procedures from its day on are still being recomputed. */
  isBeingApplied: z.boolean(),
});
export type CalibrationFactor = z.infer<typeof calibrationFactorSchema>;

export const calibrationFactorInputSchema = z.object({
  equipmentId: idSchema,
  plane: z.enum(calibratedPlanes),
  quantity: z.enum(calibratedQuantities),
  factor: z.number().min(0.2, 'Between 0.2 and 5.').max(5, 'Between 0.2 and 5.'),
  uncertaintyPercent: z.number().min(0, 'Between 0 and 100 %.').max(100, 'Between 0 and 100 %.').nullable(),
  validFrom: calendarDateSchema,
  source: requiredText(300),
});
export type CalibrationFactorInput = z.input<typeof calibrationFactorInputSchema>;
