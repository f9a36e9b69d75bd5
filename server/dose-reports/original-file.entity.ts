import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { now, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';

/** The bytes of a file as they came, compressed; in a table of their own so that lists never touch them. */
@Entity()
@Index(['hospitalId', 'sha256'])
export class OriginalFile {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) sha256: string;
  @Column({ type: 'integer' }) byteCount: number;
  @Column({ type: 'bytea' }) deflatedBytes: Buffer;
  @Column(now) receivedAt: Date;
}
