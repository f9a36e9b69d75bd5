import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Remark } from '../../shared/contract/common';
import type { Duty } from '../../shared/contract/record';
import {
  count,
  document,
  documents,
  now,
  optionalQuantity,
  optionalText,
  optionalUuid,
  text,
  uuid,
} from '../db/columns';
import { Person } from '../people/person.entity';
import { Presence } from '../procedures/presence.entity';
import { Procedure } from '../procedures/procedure.entity';

/** One person's estimate for one procedure, with its inputs and version. Appended, never changed. */
@Entity()
@Index(['procedureId', 'revision'])
@Index(['personId', 'procedureId'])
// Covers further columns, which a decorator cannot say: made by its migration.
@Index('ix_staff_estimate_exposure', { synchronize: false })
export class StaffEstimate {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  procedureId: string;
  @ForeignKey(() => Presence)
  @Column(uuid)
  presenceId: string;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  personId: string | null;
  @Column(count) revision: number;
  @Column(text) duty: Duty;
  @Column(now) computedAt: Date;
  @Column(optionalText) reason: string | null;
  @Column(text) method: string;
  @Column(text) methodVersion: string;
  @Column(text) scatterModel: string;
  @Column(text) effectiveDoseFormula: string;
  @Column(optionalQuantity) collarAirKermaUGy: number | null;
  @Column(optionalQuantity) collarAirKermaLowUGy: number | null;
  @Column(optionalQuantity) collarAirKermaHighUGy: number | null;
  @Column(optionalQuantity) eyeAirKermaUGy: number | null;
  @Column(optionalQuantity) eyeAirKermaLowUGy: number | null;
  @Column(optionalQuantity) eyeAirKermaHighUGy: number | null;
  @Column(optionalQuantity) waistAirKermaUGy: number | null;
  @Column(optionalQuantity) waistAirKermaLowUGy: number | null;
  @Column(optionalQuantity) waistAirKermaHighUGy: number | null;
  @Column(optionalQuantity) collarHp10USv: number | null;
  @Column(optionalQuantity) collarHp10LowUSv: number | null;
  @Column(optionalQuantity) collarHp10HighUSv: number | null;
  @Column(optionalQuantity) eyeHp3USv: number | null;
  @Column(optionalQuantity) eyeHp3LowUSv: number | null;
  @Column(optionalQuantity) eyeHp3HighUSv: number | null;
  @Column(optionalQuantity) underGarmentHp10USv: number | null;
  @Column(optionalQuantity) underGarmentHp10LowUSv: number | null;
  @Column(optionalQuantity) underGarmentHp10HighUSv: number | null;
  @Column(optionalQuantity) effectiveDoseUSv: number | null;
  @Column(optionalQuantity) effectiveDoseLowUSv: number | null;
  @Column(optionalQuantity) effectiveDoseHighUSv: number | null;
  @Column(optionalQuantity) fluoroscopyShare: number | null;
  /** What the figures rest on: person, place, shields, context. Events stay in their own table. */
  @Column(document) inputs: unknown;
  @Column(documents) contributions: { input: string; share: number }[];
  @Column(documents) gaps: Remark[];
  @Column(documents) warnings: Remark[];
}
