import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { Attachment } from '../attachments/attachment.entity';
import { document, now, optionalText, optionalUuid, text, uuid } from '../db/columns';
import { DoseReport } from '../dose-reports/dose-report.entity';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** What somebody typed from a machine's screen, to the letter; a correction is a further row that names the one it replaces. */
@Entity()
@Index(['doseReportId'])
@Index(['photoId'])
export class ManualEntry {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  /** The report that stands for the entry in its procedure. */
  @ForeignKey(() => DoseReport)
  @Column(uuid)
  doseReportId: string;
  /** Local wall-clock time of the procedure's start. */
  @Column(text) localStartedAt: string;
  @Column(document) quantities: TypedQuantity[];
  @ForeignKey(() => Attachment)
  @Column(optionalUuid)
  photoId: string | null;
  @Column(optionalText) comment: string | null;
  /** Why it replaces the one before. */
  @Column(optionalText) reason: string | null;
  @ForeignKey(() => ManualEntry)
  @Column(optionalUuid)
  replacesId: string | null;
  @ForeignKey(() => Person)
  @Column(uuid)
  enteredById: string;
  @Column(now) enteredAt: Date;
}
