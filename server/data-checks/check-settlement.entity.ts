import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { CheckDecision, SettledFigures } from '../../shared/contract/data-check';
import { now, optionalDocument, optionalMoment, optionalUuid, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';
import { Procedure } from '../procedures/procedure.entity';

/** What a physicist said about one finding of one procedure. Appended; a later one or a withdrawal ends it. */
@Entity()
@Index(['procedureId', 'ruleCode'])
export class CheckSettlement {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  procedureId: string;
  @Column(text) ruleCode: string;
  /** The finding in words as it was settled: another finding of the same rule is not settled by it. */
  @Column(text) finding: string;
  @Column(text) decision: CheckDecision;
  /** Values that count in place of the reported ones; null unless the decision corrects them. */
  @Column(optionalDocument) corrected: SettledFigures | null;
  @Column(text) reason: string;
  @ForeignKey(() => Person)
  @Column(uuid)
  decidedById: string;
  @Column(now) decidedAt: Date;
  @Column(optionalMoment) endedAt: Date | null;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  endedById: string | null;
}
