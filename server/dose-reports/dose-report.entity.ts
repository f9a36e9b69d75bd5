import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Remark } from '../../shared/contract/common';
import type { Report } from '../../shared/contract/report';
import {
  documents,
  now,
  optionalCount,
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
import { OriginalFile } from './original-file.entity';

/** One file that came, from "received" to its outcome. */
@Entity()
@Index(['hospitalId', 'sopInstanceUid'], { unique: true, where: "outcome = 'stored'" })
@Index(['hospitalId', 'receivedAt', 'id'])
@Index(['procedureId'])
export class DoseReport {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @ForeignKey(() => OriginalFile)
  @Column(optionalUuid)
  originalFileId: string | null;
  @Column(text) fileName: string;
  @Column(text) channel: 'page' | 'generated';
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
}
