import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Role } from '../../shared/permissions';
import { optionalText, text, texts, uuid } from '../db/columns';
import { Person } from './person.entity';

/** A person's sign-in. E-mail addresses are kept in lower case; no password until the link was used. */
@Entity()
@Index(['email'], { unique: true })
export class Account {
  @ForeignKey(() => Person, { onDelete: 'CASCADE' })
  @PrimaryColumn(uuid)
  personId: string;
  @Column(text) email: string;
  @Column(optionalText) passwordHash: string | null;
  @Column(texts) roles: Role[];
}
