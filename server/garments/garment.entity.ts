import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Garment as GarmentContract, GarmentKind } from '../../shared/contract/garment';
import {
  optionalDay,
  optionalQuantity,
  optionalText,
  optionalUuid,
  text,
  uuid,
  version,
  yesNo,
} from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';

@Entity()
@Index(['hospitalId', 'code'], { unique: true })
export class Garment {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) code: string;
  @Column(text) kind: GarmentKind;
  @Column(text) material: GarmentContract['material'];
  @Column(optionalQuantity) frontLeadMm: number | null;
  @Column(optionalQuantity) backLeadMm: number | null;
  /** Tube voltage at which the lead equivalence holds. */
  @Column(optionalQuantity) leadKvp: number | null;
  @Column(yesNo) isMeasured: boolean;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  ownerId: string | null;
  @Column(text) state: GarmentContract['state'];
  @Column(optionalDay) lastInspectedOn: string | null;
  @Column(optionalDay) nextDueOn: string | null;
  @Column(optionalText) note: string | null;
  @Column(version) version: number;
}
