import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { now, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** A picture or paper that somebody put beside a record, as it came; its kind was told from its content. */
@Entity()
export class Attachment {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) fileName: string;
  @Column(text) mediaType: string;
  @Column(text) sha256: string;
  @Column({ type: 'integer' }) byteCount: number;
  @Column({ type: 'bytea' }) bytes: Buffer;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  createdById: string | null;
  @Column(now) createdAt: Date;
}
