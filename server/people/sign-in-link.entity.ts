import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { moment, optionalMoment, optionalUuid, text } from '../db/columns';
import { Person } from './person.entity';

/** A one-time link, kept as a hash: makes the first administrator, or lets a person choose a password. */
@Entity()
export class SignInLink {
  @PrimaryColumn(text) tokenHash: string;
  @Column(text) purpose: 'first-administrator' | 'invitation';
  @ForeignKey(() => Person, { onDelete: 'CASCADE' })
  @Column(optionalUuid)
  personId: string | null;
  @Column(moment) expiresAt: Date;
  @Column(optionalMoment) usedAt: Date | null;
}
