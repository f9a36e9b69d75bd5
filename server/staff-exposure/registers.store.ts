import type { EntityManager } from 'typeorm';
import { Equipment } from '../equipment/equipment.entity';
import { Garment } from '../garments/garment.entity';
import { Person } from '../people/person.entity';
import { ProcedureType } from '../procedure-types/procedure-type.entity';
import type { EstimateRegisters } from './estimate-rows';

/** Garments by id, statures by person, usual kVp by procedure type, tube position by machine. */
export async function readRegisters(db: EntityManager, hospitalId: string): Promise<EstimateRegisters> {
  const garments = await db.findBy(Garment, { hospitalId });
  const people = await db.findBy(Person, { hospitalId });
  const types = await db.findBy(ProcedureType, { hospitalId });
  const machines = await db.findBy(Equipment, { hospitalId });
  return {
    garments: new Map(garments.map((garment) => [garment.id, garment])),
    staturesM: new Map(people.map(({ id, statureM }) => [id, statureM])),
    typicalKvps: new Map(types.map(({ id, typicalKvp }) => [id, typicalKvp])),
    tubePositions: new Map(machines.map(({ id, tubePosition }) => [id, tubePosition])),
  };
}
