import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { optionalQuantity, text, texts, uuid, version } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';

@Entity()
@Index(['hospitalId', 'key'], { unique: true })
export class ProcedureType {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(text) key: string;
  @Column(text) name: string;
  @Column(text) bodyRegion: 'head' | 'chest' | 'abdomen' | 'pelvis' | 'extremity' | 'other';
  @Column(optionalQuantity) typicalKvp: number | null;
  @Column(texts) recognisedBy: string[];
  @Column({ type: 'boolean', default: true }) isActive: boolean;
  @Column(version) version: number;
}
