import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Remark } from '../../shared/contract/common';
import type { Report } from '../../shared/contract/report';
import {
  documents,
  now,
  optionalCount,
  optionalDocument,
  optionalMoment,
  optionalText,
  optionalUuid,
  text,
  texts,
  uuid,
} from '../db/columns';
import { Equipment } from '../equipment/equipment.entity';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';
import { Procedure } from '../procedures/procedure.entity';
import { ReceivedArchive } from './archive.entity';
import { OriginalFile } from './original-file.entity';

/** A report without patient, planes and events, which stand in tables and columns of their own. */
export type ReportContext = Omit<Report, 'patient' | 'planes' | 'events'>;

/** One file that came, from "received" to its outcome. */
@Entity()
@Index(['hospitalId', 'sopInstanceUid'], { unique: true, where: "outcome = 'stored'" })
@Index(['hospitalId', 'receivedAt', 'id'])
@Index(['procedureId'])
@Index(['equipmentId'])
@Index(['archiveId'])
@Index(['originalFileId'])
@Index(['hospitalId', 'uploadKey'], { unique: true, where: 'upload_key is not null' })
export class DoseReport {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @ForeignKey(() => OriginalFile)
  @Column(optionalUuid)
  originalFileId: string | null;
  @Column(text) fileName: string;
  /** The folder path inside an archive, where it came in one, stands in `fileName`. */
  @Column(optionalText) archiveName: string | null;
  @ForeignKey(() => ReceivedArchive)
  @Column(optionalUuid)
  archiveId: string | null;
  /** The sender's own key for this file: a repeated sending finds the first. */
  @Column(optionalUuid) uploadKey: string | null;
  @Column(text) channel: 'page' | 'generated' | 'manual';
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  receivedById: string | null;
  @Column(now) receivedAt: Date;
  @Column(text) outcome: 'received' | 'stored' | 'duplicate' | 'held' | 'refused';
  @Column(optionalMoment) settledAt: Date | null;
  @Column(optionalText) reasonCode: string | null;
  @Column(optionalText) reasonDetail: string | null;
  @Column(optionalText) sopInstanceUid: string | null;
  /** Hash of the canonical content: senders rewrite headers and syntaxes. */
  @Column(optionalText) contentHash: string | null;
  @Column(optionalText) contentAt: string | null;
  @ForeignKey(() => Procedure)
  @Column(optionalUuid)
  procedureId: string | null;
  @ForeignKey(() => Equipment)
  @Column(optionalUuid)
  equipmentId: string | null;
  @Column(optionalCount) eventCount: number | null;
  /** Keys of the events it holds: tells which report is the newest that knows them all. */
  @Column(texts) eventKeys: string[];
  @Column(documents) reportedPlanes: Report['planes'];
  @Column(documents) warnings: Remark[];
  @Column(optionalText) readerVersion: string | null;
  /** What the report says beside patient, planes and events; may carry names. */
  @Column(optionalDocument) context: ReportContext | null;
  /** When the bytes of a refused file were deleted, its time of keeping being over. */
  @Column(optionalMoment) purgedAt: Date | null;
}
