import type { CalibrationFactor } from '../equipment/calibration-factor.entity';
import type { Checking } from '../data-checks/check-data';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import type { Level } from '../levels/level.entity';
import type { IrradiationEvent } from './irradiation-event.entity';
import type { Procedure } from './procedure.entity';

/** A stored report as far as a procedure's totals need it. */
export type SummaryReport = Pick<
  DoseReport,
  | 'id'
  | 'equipmentId'
  | 'channel'
  | 'receivedAt'
  | 'contentAt'
  | 'eventKeys'
  | 'reportedPlanes'
  | 'warnings'
  | 'context'
>;

export type SummaryEvent = Omit<IrradiationEvent, 'procedureId' | 'reported' | 'details' | 'filters'>;

export type SummaryFactor = Pick<
  CalibrationFactor,
  'equipmentId' | 'plane' | 'quantity' | 'factor' | 'validFrom'
>;

/** Everything that a procedure's totals, strip, checks and attention follow from. */
export type SummaryInput = {
  procedure: Pick<
    Procedure,
    'fieldsOverlap' | 'procedureClass' | 'deviceClass' | 'patientHeightM' | 'patientWeightKg'
  >;
  reports: SummaryReport[];
  events: SummaryEvent[];
  equipmentLabels: Map<string, string>;
  factors: SummaryFactor[];
  levels: Pick<Level, 'quantity' | 'strength' | 'value'>[];
  /** The study's own time, where no event has one. */
  studyStartedAt: string | null;
  receivedAt: Date;
  timeZone: string;
  now: Date;
  /** The department's settings, what was settled, and what other procedures say. */
  checking: Checking;
};
