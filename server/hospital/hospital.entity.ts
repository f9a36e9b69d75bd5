import { Column, Entity, PrimaryColumn } from 'typeorm';
import { now, optionalMoment, text, uuid, yesNo } from '../db/columns';

/** Every row that belongs to a hospital carries its id. Its zone decides days and months. */
@Entity()
export class Hospital {
  @PrimaryColumn(uuid) id: string;
  @Column(text) name: string;
  @Column(text) timeZone: string;
  @Column(yesNo) isDemo: boolean;
  /** Set when the demo's last row is written; a start that finds it missing begins the demo again. */
  @Column(optionalMoment) demoFinishedAt: Date | null;
  @Column(now) createdAt: Date;
}
