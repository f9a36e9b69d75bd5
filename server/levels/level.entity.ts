import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { day, optionalUuid, quantity, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { ProcedureType } from '../procedure-types/procedure-type.entity';

/** A department's own level for a quantity, in canonical units, from a date on, with its source. */
@Entity()
export class Level {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) quantity: 'reference-air-kerma' | 'kerma-area-product' | 'fluoroscopy-time';
  @Column(text) strength: 'notify' | 'act';
  @Column(quantity) value: number;
  @ForeignKey(() => ProcedureType)
  @Column(optionalUuid)
  procedureTypeId: string | null;
  @Column(day) validFrom: string;
  @Column(text) source: string;
}
