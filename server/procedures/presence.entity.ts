import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Duty, Place, Presence as PresenceContract } from '../../shared/contract/record';
import {
  count,
  optionalDocument,
  optionalQuantity,
  optionalText,
  optionalUuid,
  optionalYesNo,
  text,
  uuid,
  yesNo,
} from '../db/columns';
import { Garment } from '../garments/garment.entity';
import { Person } from '../people/person.entity';
import { Procedure } from './procedure.entity';

/** One person in the room: where they stood and what they wore. Corrections append a revision. */
@Entity()
@Index(['procedureId', 'revision'])
export class Presence {
  @PrimaryColumn(uuid) id: string;
  @ForeignKey(() => Procedure)
  @Column(uuid)
  procedureId: string;
  @Column(count) revision: number;
  @Column(count) position: number;
  @ForeignKey(() => Person)
  @Column(optionalUuid)
  personId: string | null;
  @Column(optionalText) visitorName: string | null;
  @Column(text) duty: Duty;
  @Column(optionalDocument) fluoroscopyPlace: Place | null;
  @Column(optionalDocument) acquisitionPlace: Place | null;
  @Column(yesNo) isTurnedAway: boolean;
  @Column(yesNo) isPresentDuringRotation: boolean;
  @Column(text) garmentAnswer: PresenceContract['garmentAnswer'];
  @ForeignKey(() => Garment)
  @Column(optionalUuid)
  garmentId: string | null;
  @Column(optionalYesNo) hasThyroidCollar: boolean | null;
  @Column(yesNo) hasGlasses: boolean;
  @Column(yesNo) hasCeilingScreen: boolean;
  @Column(yesNo) hasTableSkirt: boolean;
  @Column(yesNo) hasMobileScreen: boolean;
  @Column(optionalQuantity) presentFromS: number | null;
  @Column(optionalQuantity) presentToS: number | null;
}
