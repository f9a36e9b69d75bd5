import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { RegroupingKind } from '../../shared/contract/regrouping';
import { document, now, optionalMoment, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';
import { Procedure } from '../procedures/procedure.entity';

/** Reports that a physicist moved from one procedure to another, and enough to move them back. */
@Entity()
@Index(['sourceId'])
@Index(['targetId'])
export class Regrouping {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) kind: RegroupingKind;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  sourceId: string;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  targetId: string;
  @Column({ type: 'uuid', array: true }) doseReportIds: string[];
  /** Events and totals of both procedures before and after: what "identical again" is checked against. */
  @Column(document) evidence: unknown;
  @Column(text) reason: string;
  @ForeignKey(() => Person)
  @Column(uuid)
  doneById: string;
  @Column(now) doneAt: Date;
  @Column(optionalMoment) undoneAt: Date | null;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  undoneById: string | null;
}
