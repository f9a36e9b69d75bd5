import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { SettledFigures } from '../../shared/contract/data-check';
import type { AttentionLevel, MissingPart, ProcedureRow, Strip } from '../../shared/contract/procedure-row';
import type { Procedure as ProcedureContract } from '../../shared/contract/procedure';
import {
  count,
  day,
  documents,
  moment,
  now,
  optionalDocument,
  optionalMoment,
  optionalQuantity,
  optionalText,
  optionalUuid,
  optionalYesNo,
  text,
  texts,
  uuid,
  version,
  yesNo,
} from '../db/columns';
import type { StoredCheck } from '../data-checks/check-data';
import { Equipment } from '../equipment/equipment.entity';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';
import { ProcedureType } from '../procedure-types/procedure-type.entity';
import { Room } from '../rooms/room.entity';
import { PatientIdentity } from './patient-identity.entity';

/**
 * One procedure: a study of a patient. Totals are recomputed from its reports and events, never added to.
 * The ledger and the dashboards read this row only.
 */
@Entity()
@Index(['hospitalId', 'studyInstanceUid', 'patientKey'], { unique: true })
@Index(['hospitalId', 'startedAt', 'id'])
@Index(['hospitalId', 'caseNumber'], { unique: true })
@Index(['procedureTypeId', 'startedAt'])
@Index(['primaryOperatorId', 'startedAt'])
@Index(['hospitalId', 'accessionKey'])
@Index(['equipmentId', 'startedAt'])
// Partial, with further columns, which a decorator cannot say: made by its migration.
@Index('ix_procedure_exposure', { synchronize: false })
@Index(['hospitalId', 'startedAt'], { where: 'attention_level is not null' })
export class Procedure {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) caseNumber: string;
  @Column(text) studyInstanceUid: string;
  /** Hash of the patient ID: the same study UID of another patient is another procedure. */
  @Column(text) patientKey: string;
  /** Hash of accession number and patient ID: a case that a restart split in two studies. */
  @Column(optionalText) accessionKey: string | null;
  @ForeignKey(() => PatientIdentity)
  @Column(optionalUuid)
  patientIdentityId: string | null;
  @ForeignKey(() => Room)
  @Column(optionalUuid)
  roomId: string | null;
  @ForeignKey(() => Equipment)
  @Column(optionalUuid)
  equipmentId: string | null;
  @Column(optionalText) studyDescription: string | null;

  @Column(moment) startedAt: Date;
  @Column(optionalMoment) endedAt: Date | null;
  /** The device's wall clock, ISO 8601, with an offset where the file gave one. */
  @Column(text) localStartedAt: string;
  @Column(optionalText) localEndedAt: string | null;
  /** Day in the hospital's zone. */
  @Column(day) localDate: string;
  @Column(text) timeBasis: ProcedureRow['timeBasis'];
  @Column({ type: 'text', default: 'fluoroscopy' }) deviceClass: ProcedureRow['deviceClass'];
  @Column({ type: 'text', default: 'clinical' }) procedureClass: ProcedureRow['procedureClass'];

  @Column(optionalQuantity) fluoroscopyTimeS: number | null;
  /** Corrected where a factor holds, else as displayed. */
  @Column(optionalQuantity) referenceAirKermaGy: number | null;
  @Column(optionalQuantity) displayedReferenceAirKermaGy: number | null;
  @Column(yesNo) isReferenceAirKermaUpperBound: boolean;
  @Column(optionalQuantity) kermaAreaProductGyCm2: number | null;
  @Column(optionalQuantity) displayedKermaAreaProductGyCm2: number | null;
  @Column(yesNo) isCorrected: boolean;
  /** Weighted by kerma-area product. */
  @Column(optionalQuantity) kvpMean: number | null;
  @Column(count) eventCount: number;
  @Column(optionalDocument) strip: Strip | null;
  @Column(documents) planes: ProcedureContract['planes'];
  @Column(documents) dataChecks: StoredCheck[];
  /** Typed by a physicist in place of reported totals, which were wrong. */
  @Column(optionalDocument) settledFigures: SettledFigures | null;
  /** A value failed a hard check: outside every statistic until a physicist settles it. */
  @Column(yesNo) isQuarantined: boolean;
  @Column(optionalText) attentionLevel: AttentionLevel | null;
  @Column(documents) attentionReasons: { level: AttentionLevel; code: string; detail: string }[];
  @Column(optionalYesNo) fieldsOverlap: boolean | null;

  @Column({ type: 'text', default: 'incomplete' }) recordState: 'incomplete' | 'complete';
  @Column(texts) missing: MissingPart[];
  @ForeignKey(() => ProcedureType)
  @Column(optionalUuid)
  procedureTypeId: string | null;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  primaryOperatorId: string | null;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  secondOperatorId: string | null;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  traineeId: string | null;
  @Column(optionalText) accessSide: 'right' | 'left' | 'head' | null;
  @Column(optionalYesNo) isFeetFirst: boolean | null;
  @Column(optionalYesNo) isProne: boolean | null;
  @Column(optionalYesNo) isEmergency: boolean | null;
  @Column(optionalQuantity) patientHeightM: number | null;
  @Column(optionalQuantity) patientWeightKg: number | null;
  @Column(texts) fromFile: string[];
  @Column(optionalMoment) completedAt: Date | null;

  /** Presences and estimates are appended; the rows of this revision are the valid ones. */
  @Column(count) recordRevision: number;
  @Column(count) estimateRevision: number;
  @Column(yesNo) isWithdrawn: boolean;
  /** The procedure that took over all of its reports; it is withdrawn then. */
  @ForeignKey(() => Procedure)
  @Column(optionalUuid)
  mergedIntoId: string | null;
  /** Its totals were typed from the machine's screen: no report came. */
  @Column(yesNo) isManual: boolean;
  /** Made by the demo's generator: no original file exists. */
  @Column(yesNo) isGenerated: boolean;
  @Column(version) version: number;
  @Column(now) createdAt: Date;
}
