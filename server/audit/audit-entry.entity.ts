import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { now, optionalDocument, optionalText, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** Who did what to what, when and why. A trigger refuses every change and deletion. */
@Entity()
@Index(['subjectId', 'at'])
@Index(['hospitalId', 'at'])
export class AuditEntry {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(now) at: Date;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  actorId: string | null;
  @Column(text) action: string;
  @Column(text) subject: string;
  @Column(optionalUuid) subjectId: string | null;
  @Column(optionalDocument) before: unknown;
  @Column(optionalDocument) after: unknown;
  @Column(optionalText) reason: string | null;
}
