import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Job } from '../../shared/contract/person';
import { now, optionalQuantity, text, uuid, version, yesNo } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';

/** Somebody who works in the rooms, with or without a sign-in. */
@Entity()
@Index(['hospitalId', 'name'])
export class Person {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) name: string;
  @Column(text) job: Job;
  @Column(optionalQuantity) statureM: number | null;
  @Column(yesNo) isMonitored: boolean;
  @Column({ type: 'boolean', default: true }) isActive: boolean;
  @Column(version) version: number;
  @Column(now) createdAt: Date;
}
