import { z } from 'zod';

import { printedEventSchema, reportEventSchema } from './report-event';
import {
  codeSchema,
  deviceParticipantSchema,
  furtherItemSchema,
  imageReferenceSchema,
  measured,
  observerSchema,
  optionalText as text,
  personParticipantSchema,
  planeSchema,
  preciseValues,
  qualifiers,
  referencePointSchema,
  reported,
} from './report-parts';

export const printedPlaneSchema = z.object({
  plane: planeSchema.nullable(),
  kermaAreaProductGyCm2: measured,
  referenceAirKermaGy: measured,
  fluoroscopyTimeS: measured,
  fluoroscopyKermaAreaProductGyCm2: measured,
  fluoroscopyReferenceAirKermaGy: measured,
  acquisitionKermaAreaProductGyCm2: measured,
  acquisitionReferenceAirKermaGy: measured,
  acquisitionTimeS: measured,
});

/** TID 10002 rows 3 to 9: information only, never applied to a value by the reader. */
export const calibrationSchema = z.object({
  /** What measured, for example a dosimeter (CID 10010). */
  measurementDevice: codeSchema.nullable(),
  calibratedAt: text,
  factor: measured,
  uncertaintyPercent: measured,
  responsibleParty: text,
  protocol: text,
  reported,
});

/** What the file reports for one plane (TID 10002 with 10004, 10006 or 10007); never a sum of ours. */
export const reportPlaneSchema = printedPlaneSchema.extend({
  planeCode: codeSchema.nullable(),
  sourceToReferencePointMm: measured,
  frameCount: measured,
  detectorType: codeSchema.nullable(),
  referencePointDefinition: referencePointSchema.nullable(),
  calibrations: z.array(calibrationSchema),
  devices: z.array(deviceParticipantSchema),
  reported,
  qualifiers,
  preciseValues,
  furtherItems: z.array(furtherItemSchema),
});
export type ReportPlane = z.infer<typeof reportPlaneSchema>;

export const reportWarningSchema = z.object({ code: z.string(), detail: z.string() });
export type ReportWarning = z.infer<typeof reportWarningSchema>;

/** The shape that `npm run read-report` prints. */
export const printedReportSchema = z.object({
  sopInstanceUid: text,
  sopClassUid: text,
  studyInstanceUid: text,
  accessionNumber: text,
  studyDescription: text,
  startedAt: text,
  patient: z.object({
    name: text,
    id: text,
    birthDate: text,
    sex: text,
    heightM: measured,
    weightKg: measured,
  }),
  equipment: z.object({
    manufacturer: text,
    modelName: text,
    serialNumber: text,
    stationName: text,
    institutionName: text,
  }),
  planes: z.array(printedPlaneSchema),
  events: z.array(printedEventSchema),
  warnings: z.array(reportWarningSchema),
});
export type PrintedReport = z.infer<typeof printedReportSchema>;

export const scopeSchema = z.object({
  code: codeSchema.nullable(),
  uidType: codeSchema.nullable(),
  uid: text,
});

/** Referenced Request Sequence (0040,A370): the order behind the study, where the header's own number is empty. */
export const requestSchema = z.object({
  accessionNumber: text,
  requestedProcedureId: text,
  requestedProcedureDescription: text,
  requestedProcedureCodes: z.array(codeSchema),
});
export type ReportRequest = z.infer<typeof requestSchema>;

export const availabilities = ['yes', 'no', 'undetermined'] as const;
const availability = z.enum(availabilities).nullable();

/** Everything the reader finds in an X-Ray Radiation Dose SR, in canonical units; absent is null. */
export const reportSchema = printedReportSchema.omit({ warnings: true }).extend({
  patient: printedReportSchema.shape.patient.extend({ age: text, position: text, reported }),
  equipment: printedReportSchema.shape.equipment.extend({
    softwareVersions: text,
    deviceUid: text,
    departmentName: text,
  }),
  planes: z.array(reportPlaneSchema),
  events: z.array(reportEventSchema),
  /** "+01:00" where the file gives one for `startedAt`. */
  utcOffset: text,
  seriesInstanceUid: text,
  studyId: text,
  studyAt: text,
  contentAt: text,
  instanceNumber: text,
  completionFlag: text,
  verificationFlag: text,
  /** Template Identifier of the root, where it is given. */
  templateId: text,
  requests: z.array(requestSchema),
  /** Procedure Code Sequence (0008,1032) and Performed Procedure Code Sequence (0040,A372). */
  procedureCodes: z.array(codeSchema),
  language: codeSchema.nullable(),
  country: codeSchema.nullable(),
  procedureReported: codeSchema.nullable(),
  intent: codeSchema.nullable(),
  /** Intent (113680, DCM): phantom, service and quality-control exposures. */
  isQualityControl: z.boolean(),
  acquisitionDeviceType: codeSchema.nullable(),
  deviceClass: z.enum(['fluoroscopy', 'radiography']),
  detectorType: codeSchema.nullable(),
  /** Whether the machine could state detector, source and geometry at all (CID 230). */
  detectorDataAvailable: availability,
  sourceDataAvailable: availability,
  mechanicalDataAvailable: availability,
  scopeOfAccumulation: scopeSchema.nullable(),
  sourcesOfInformation: z.array(codeSchema),
  predecessors: z.array(z.object({ sopClassUid: text, sopInstanceUid: text })),
  observers: z.array(observerSchema),
  persons: z.array(personParticipantSchema),
  comment: text,
  doseImages: z.array(imageReferenceSchema),
  furtherItems: z.array(furtherItemSchema),
});
export type Report = z.infer<typeof reportSchema>;

/** The command line's shape: the fields of the contract in their order, nothing beside. */
export function toPrintedReport(report: Report, warnings: ReportWarning[]): PrintedReport {
  return printedReportSchema.parse({ ...report, warnings });
}
