import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { optionalText, text, uuid, version } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';

@Entity()
@Index(['hospitalId', 'code'], { unique: true })
export class Room {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) code: string;
  @Column(text) name: string;
  @Column(optionalText) note: string | null;
  @Column({ type: 'boolean', default: true }) isActive: boolean;
  @Column(version) version: number;
}
