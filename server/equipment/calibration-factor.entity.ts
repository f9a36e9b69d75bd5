import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { day, now, optionalQuantity, quantity, text, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';
import { Person } from '../people/person.entity';
import { Equipment } from './equipment.entity';

/** True over displayed from a date on; rows are added, never changed. */
@Entity()
@Index(['equipmentId', 'plane', 'quantity', 'validFrom'])
export class CalibrationFactor {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @ForeignKey(() => Equipment)
  @Column(uuid)
  equipmentId: string;
  @Column(text) plane: 'single' | 'A' | 'B';
  @Column(text) quantity: 'reference-air-kerma' | 'kerma-area-product';
  @Column(quantity) factor: number;
  @Column(optionalQuantity) uncertaintyPercent: number | null;
  @Column(day) validFrom: string;
  @Column(text) source: string;
  @ForeignKey(() => Person)
  @Column(uuid)
  enteredById: string;
  @Column(now) enteredAt: Date;
}
