import { z } from 'zod';
import { idSchema, localDateTimeSchema } from './common';

const measured = z.number().nullable();

export const filterSchema = z.object({
  type: z.string().nullable(),
  material: z.string().nullable(),
  minThicknessMm: measured,
  maxThicknessMm: measured,
});

/** One irradiation event of one plane, in canonical units; `reported` keeps what the file said, to the letter. */
export const irradiationEventSchema = z.object({
  id: idSchema,
  irradiationEventUid: z.string().nullable(),
  plane: z.enum(['single', 'A', 'B', 'all']).nullable(),
  type: z.string().nullable(),
  startedAt: localDateTimeSchema.nullable(),
  offsetS: z.number(),
  protocol: z.string().nullable(),
  kvpValues: z.array(z.number()),
  kvpMean: measured,
  tubeCurrentMa: measured,
  pulseWidthMs: measured,
  pulseCount: measured,
  pulseRatePerS: measured,
  exposureTimeS: measured,
  irradiationDurationS: measured,
  kermaAreaProductGyCm2: measured,
  referenceAirKermaGy: measured,
  airKermaRateGyPerS: measured,
  airKermaRateBasis: z.enum(['irradiation-duration', 'exposure-time', 'kerma-area-product']).nullable(),
  primaryAngleDeg: measured,
  secondaryAngleDeg: measured,
  primaryEndAngleDeg: measured,
  secondaryEndAngleDeg: measured,
  sourceToDetectorMm: measured,
  sourceToIsocenterMm: measured,
  fieldAreaCm2: measured,
  filters: z.array(filterSchema),
  reported: z.record(z.string(), z.object({ text: z.array(z.string()), unit: z.string().nullable() })),
  /** What else the report says of the event, by the names of the report's contract; absent where it says nothing. */
  details: z.record(z.string(), z.unknown()),
});
export type IrradiationEvent = z.infer<typeof irradiationEventSchema>;

export const irradiationEventsSchema = z.object({ items: z.array(irradiationEventSchema) });
