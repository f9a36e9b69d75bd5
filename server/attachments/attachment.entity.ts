import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import type { PictureType } from '../../shared/contract/attachment';
import { now, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** A picture that somebody put beside a record: its pixels as they came, without place and time of taking. */
@Entity()
export class Attachment {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) purpose: 'dose-screen';
  @Column(text) fileName: string;
  /** Told from the content. */
  @Column(text) mediaType: PictureType;
  @Column(text) sha256: string;
  @Column({ type: 'integer' }) byteCount: number;
  @Column({ type: 'bytea' }) bytes: Buffer;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  createdById: string | null;
  @Column(now) createdAt: Date;
}
