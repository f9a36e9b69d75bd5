import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { now, optionalDay, optionalText, optionalUuid, text, uuid, version } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Room } from '../rooms/room.entity';

/** A machine, known by what its reports say of it. Without a room until a person assigns one. */
@Entity()
@Index(['hospitalId', 'identityKey'], { unique: true })
export class Equipment {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @ForeignKey(() => Room)
  @Column(optionalUuid)
  roomId: string | null;
  /** Manufacturer, model, serial and station joined: what makes two reports the same machine's. */
  @Column(text) identityKey: string;
  @Column(optionalText) manufacturer: string | null;
  @Column(optionalText) modelName: string | null;
  @Column(optionalText) serialNumber: string | null;
  @Column(optionalText) stationName: string | null;
  @Column(text) label: string;
  @Column({ type: 'text', default: 'under-table' }) tubePosition: 'under-table' | 'over-table';
  @Column(optionalDay) inServiceFrom: string | null;
  @Column(optionalDay) inServiceTo: string | null;
  @Column(version) version: number;
  @Column(now) createdAt: Date;
}
