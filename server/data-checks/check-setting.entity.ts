import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { CheckOwner, CheckSeverity } from '../../shared/contract/data-check';
import { day, now, optionalQuantity, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

/** How a department wants one data check, from a day on; without a row the product's own setting holds. */
@Entity()
@Index(['hospitalId', 'ruleCode', 'validFrom'])
export class CheckSetting {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) ruleCode: string;
  @Column(text) severity: CheckSeverity;
  @Column(text) owner: CheckOwner;
  /** Bounds in the rule's own unit; null where the rule has none on that side. */
  @Column(optionalQuantity) low: number | null;
  @Column(optionalQuantity) high: number | null;
  @Column(day) validFrom: string;
  @Column(text) reason: string;
  @ForeignKey(() => Person)
  @Column(uuid)
  setById: string;
  @Column(now) setAt: Date;
}
