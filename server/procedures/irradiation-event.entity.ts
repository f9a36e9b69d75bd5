import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { IrradiationEvent as EventContract } from '../../shared/contract/irradiation-event';
import {
  documents,
  moment,
  optionalQuantity,
  optionalText,
  optionalUuid,
  quantities,
  text,
  uuid,
} from '../db/columns';
import { DoseReport } from '../dose-reports/dose-report.entity';
import { Procedure } from './procedure.entity';

/** One irradiation event of one plane. The key holds the start time so that the table can be cut by time. */
@Entity()
@Index(['procedureId', 'eventKey', 'startedAt'], { unique: true })
@Index(['irradiationEventUid'])
export class IrradiationEvent {
  @PrimaryColumn(uuid) id: string;
  /** The device's start by the hospital's zone; the procedure's where the event has none. */
  @PrimaryColumn(moment) startedAt: Date;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  procedureId: string;
  @ForeignKey(() => DoseReport)
  @Column(optionalUuid)
  doseReportId: string | null;
  /** Irradiation event UID and plane: what makes two items the same event. */
  @Column(text) eventKey: string;
  @Column(optionalText) irradiationEventUid: string | null;
  @Column(optionalText) plane: EventContract['plane'];
  @Column(optionalText) type: string | null;
  @Column(optionalText) localStartedAt: string | null;
  @Column(optionalText) protocol: string | null;
  @Column(quantities) kvpValues: number[];
  @Column(optionalQuantity) kvpMean: number | null;
  @Column(optionalQuantity) tubeCurrentMa: number | null;
  @Column(optionalQuantity) pulseWidthMs: number | null;
  @Column(optionalQuantity) pulseCount: number | null;
  @Column(optionalQuantity) pulseRatePerS: number | null;
  @Column(optionalQuantity) exposureTimeS: number | null;
  @Column(optionalQuantity) irradiationDurationS: number | null;
  @Column(optionalQuantity) kermaAreaProductGyCm2: number | null;
  @Column(optionalQuantity) referenceAirKermaGy: number | null;
  @Column(optionalQuantity) primaryAngleDeg: number | null;
  @Column(optionalQuantity) secondaryAngleDeg: number | null;
  @Column(optionalQuantity) primaryEndAngleDeg: number | null;
  @Column(optionalQuantity) secondaryEndAngleDeg: number | null;
  @Column(optionalQuantity) sourceToDetectorMm: number | null;
  @Column(optionalQuantity) sourceToIsocenterMm: number | null;
  @Column(optionalQuantity) sourceToReferencePointMm: number | null;
  @Column(optionalQuantity) tableLongitudinalMm: number | null;
  @Column(optionalQuantity) tableLateralMm: number | null;
  @Column(optionalQuantity) tableHeightMm: number | null;
  @Column(optionalQuantity) fieldAreaCm2: number | null;
  @Column(documents) filters: EventContract['filters'];
  /** The decimal strings and units of the file, to the letter. */
  @Column({ type: 'jsonb', default: () => "'{}'" }) reported: EventContract['reported'];
  /** Everything else that the report says of the event; what it does not say is absent. */
  @Column({ type: 'jsonb', default: () => "'{}'" }) details: EventContract['details'];
}
