import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { optionalText, uuid } from '../db/columns';
import { Hospital } from '../hospital/hospital.entity';

/** Who the patient is, apart from everything else; reached through one store and audited at each reading. */
@Entity()
@Index(['hospitalId', 'patientId'])
export class PatientIdentity {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Hospital)
  @Column(uuid)
  hospitalId: string;
  @Column(optionalText) patientId: string | null;
  @Column(optionalText) name: string | null;
  @Column(optionalText) birthDate: string | null;
  @Column(optionalText) sex: string | null;
  @Column(optionalText) accessionNumber: string | null;
}
