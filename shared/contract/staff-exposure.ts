import { z } from 'zod';
import { estimatedSchema, idSchema, localDateTimeSchema, namedSchema, remarkSchema } from './common';
import { duties } from './record';
import { jobs } from './person';
import { periods } from './procedure-row';

const figure = estimatedSchema.nullable();

/** What scatter is estimated to have reached one person in one procedure. */
export const staffExposureSchema = z.object({
  id: idSchema,
  /** Absent where the reader sees people by job title only. */
  person: namedSchema.nullable().optional(),
  visitorName: z.string().nullable().optional(),
  job: z.enum(jobs).nullable(),
  duty: z.enum(duties),
  isOwn: z.boolean(),
  garmentLabel: z.string().nullable(),
  shieldLabels: z.array(z.string()),
  evidenceGrade: z.enum(['A', 'B', 'C', 'D']),
  garmentConfirmedOn: z.string().nullable(),
  collarAirKermaUGy: figure,
  eyeAirKermaUGy: figure,
  waistAirKermaUGy: figure,
  collarHp10USv: figure,
  eyeHp3USv: figure,
  underGarmentHp10USv: figure,
  effectiveDoseUSv: figure,
  fluoroscopyShare: z.number().nullable(),
  contributions: z.array(z.object({ input: z.string(), share: z.number() })),
  gaps: z.array(remarkSchema),
  warnings: z.array(remarkSchema),
  method: z.string(),
  methodVersion: z.string(),
  scatterModel: z.string(),
  effectiveDoseFormula: z.string(),
  intervalMethod: z.enum(['closed-form', 'draws']),
  computedAt: z.string(),
});
export type StaffExposure = z.infer<typeof staffExposureSchema>;

export const staffExposuresSchema = z.object({
  items: z.array(staffExposureSchema),
  /** Said where there is no estimate at all: record incomplete, no P KA … */
  notEstimable: remarkSchema.nullable(),
});
export type StaffExposures = z.infer<typeof staffExposuresSchema>;

export const exposureQuantities = [
  'collarHp10USv',
  'eyeHp3USv',
  'underGarmentHp10USv',
  'effectiveDoseUSv',
] as const;
export type ExposureQuantity = (typeof exposureQuantities)[number];

/** `any`: whoever in the room received the most. */
export const exposureDuties = ['any', ...duties] as const;
export type ExposureDuty = (typeof exposureDuties)[number];

export const exposureFilterSchema = z.object({
  type: idSchema.optional(),
  room: idSchema.optional(),
  duty: z.enum(exposureDuties).default('primary-operator'),
  quantity: z.enum(exposureQuantities).default('collarHp10USv'),
  period: z.enum(periods).default('12m'),
  person: idSchema.optional(),
});
export type ExposureFilter = z.output<typeof exposureFilterSchema>;
export type ExposureFilterInput = z.input<typeof exposureFilterSchema>;

export const exposureMonthsFilterSchema = exposureFilterSchema.pick({ person: true, period: true });
export type ExposureMonthsFilter = z.output<typeof exposureMonthsFilterSchema>;

/** Figures without names say whose they are when fewer people than this stand behind them. */
export const fewestUnnamedPeople = 5;

/**
 * One procedure as a point: fluoroscopy time across, kVp up, tone = the estimate. Readers who see no names
 * see neither case nor moment, which lead to a name; `procedureId` is there for who may open the procedure.
 */
export const exposurePointSchema = z.object({
  procedureId: idSchema.nullable(),
  caseNumber: z.string().nullable(),
  startedAt: localDateTimeSchema.nullable(),
  procedureType: z.string(),
  room: z.string().nullable(),
  fluoroscopyTimeS: z.number().nullable(),
  kvpMean: z.number().nullable(),
  kermaAreaProductGyCm2: z.number().nullable(),
  estimate: estimatedSchema,
});
export type ExposurePoint = z.infer<typeof exposurePointSchema>;

export const exposurePointsSchema = z.object({
  items: z.array(exposurePointSchema),
  withoutEstimate: z.int(),
  incompleteRecords: z.int(),
  /** Too few people stand behind the figures to show them without names. */
  isWithheld: z.boolean(),
  method: z.string(),
  methodVersion: z.string(),
});

export type ExposurePoints = z.infer<typeof exposurePointsSchema>;

export const exposureMonthSchema = z.object({
  month: z.string().regex(/^\d{4}-\d{2}$/),
  procedures: z.int(),
  withoutEstimate: z.int(),
  collarHp10USv: figure,
  eyeHp3USv: figure,
  underGarmentHp10USv: figure,
  effectiveDoseUSv: figure,
});
export type ExposureMonth = z.infer<typeof exposureMonthSchema>;

export const exposureMonthsSchema = z.object({
  /** Null for readers to whom people are not named. */
  person: namedSchema.nullable(),
  isWithheld: z.boolean(),
  items: z.array(exposureMonthSchema),
});
export type ExposureMonths = z.infer<typeof exposureMonthsSchema>;

/** Whose months the reader may open. */
export const exposedPeopleSchema = z.object({
  items: z.array(namedSchema.extend({ job: z.enum(jobs), procedures: z.int() })),
});
export type ExposedPerson = z.infer<typeof exposedPeopleSchema>['items'][number];
