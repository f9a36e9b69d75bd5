import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { SkippedEntry } from '../../shared/contract/received-files';
import { documents, now, optionalCount, optionalMoment, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** A zip archive that came, from "received" to all of its entries having an outcome. */
@Entity()
@Index(['hospitalId', 'uploadKey'], { unique: true, where: 'upload_key is not null' })
export class ReceivedArchive {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) fileName: string;
  @Column(optionalUuid) uploadKey: string | null;
  @Column(text) sha256: string;
  @Column({ type: 'integer' }) byteCount: number;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  receivedById: string | null;
  @Column(now) receivedAt: Date;
  @Column(text) state: 'received' | 'unpacked' | 'refused';
  /** Entries that get an outcome each; null until the table of contents was read. */
  @Column(optionalCount) entryCount: number | null;
  /** Folders and system files: seen, named, not read. */
  @Column(documents) skipped: SkippedEntry[];
  @Column(optionalMoment) settledAt: Date | null;
  @Column(optionalMoment) purgedAt: Date | null;
}

/** The archive's bytes in pieces: whoever writes or reads them never holds the whole. */
@Entity()
export class ArchivePart {
  @ForeignKey(() => ReceivedArchive)
  @PrimaryColumn(uuid)
  archiveId: string;
  @PrimaryColumn({ type: 'integer' }) partNumber: number;
  @Column({ type: 'bytea' }) bytes: Buffer;
}
