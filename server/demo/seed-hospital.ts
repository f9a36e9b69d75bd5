import type { Db } from '../db/db';
import { CalibrationFactor } from '../equipment/calibration-factor.entity';
import { Equipment } from '../equipment/equipment.entity';
import { identityKeyOf } from '../equipment/equipment-identity.store';
import { Garment } from '../garments/garment.entity';
import { addHospital } from '../hospital/hospital.store';
import { newId } from '../kernel/new-id';
import { addDefaultLevels } from '../levels/add-default-levels';
import { ProcedureType } from '../procedure-types/procedure-type.entity';
import { Room } from '../rooms/room.entity';
import { startOfAnchorDay } from './calendar';
import { copyRows } from './copy-rows.store';
import { demoGarments } from './garments';
import { demoHospital, demoMonths } from './hospital';
import { demoProcedureTypes } from './procedure-types.table-data';
import { demoCalibrationFactors, demoEquipment, demoRooms } from './rooms.table-data';
import { seedPeople } from './seed-people';

/** Ids of what the procedures refer to, by their codes. */
export interface DemoIds {
  hospitalId: string;
  people: ReadonlyMap<string, string>;
  rooms: ReadonlyMap<string, string>;
  equipment: ReadonlyMap<string, string>;
  types: ReadonlyMap<string, string>;
  garments: ReadonlyMap<string, string>;
}

/** The id under a code; everything that the demo names exists. */
export function idOf(ids: ReadonlyMap<string, string>, code: string): string {
  const id = ids.get(code);
  if (!id) throw new Error(`The demo has no ${code}.`);
  return id;
}

const giveIds = (codes: readonly string[]) => new Map(codes.map((code) => [code, newId()]));

async function seedRooms(db: Db, ids: DemoIds, anchor: Date): Promise<void> {
  const { hospitalId } = ids;
  const end = startOfAnchorDay(anchor);
  const firstOfMonth = (month: number) => end.minus({ months: demoMonths + 1 - month }).toISODate();
  await copyRows(
    db,
    Room,
    demoRooms.map((room) => ({ id: idOf(ids.rooms, room.code), hospitalId, ...room })),
  );
  await copyRows(
    db,
    Equipment,
    demoEquipment.map((machine) => ({
      id: idOf(ids.equipment, machine.key),
      hospitalId,
      roomId: idOf(ids.rooms, machine.room),
      identityKey: identityKeyOf(machine),
      manufacturer: machine.manufacturer,
      modelName: machine.modelName,
      serialNumber: machine.serialNumber,
      stationName: machine.stationName,
      label: `${machine.room} ${machine.modelName}`,
      inServiceFrom: machine.fromMonth === null ? null : firstOfMonth(machine.fromMonth),
      inServiceTo:
        machine.toMonth === null
          ? null
          : end.minus({ months: demoMonths - machine.toMonth, days: 1 }).toISODate(),
    })),
  );
  await copyRows(
    db,
    CalibrationFactor,
    demoCalibrationFactors.map(({ equipmentKey: key, fromMonth, note, ...factor }) => ({
      id: newId(),
      hospitalId,
      equipmentId: idOf(ids.equipment, key),
      ...factor,
      uncertaintyPercent: 8,
      validFrom: firstOfMonth(fromMonth),
      source: note,
      enteredById: idOf(ids.people, 'P-01'),
    })),
  );
}

async function seedTypes(db: Db, ids: DemoIds): Promise<void> {
  await copyRows(
    db,
    ProcedureType,
    demoProcedureTypes.map(({ key, name, bodyRegion, typicalKvp }) => ({
      id: idOf(ids.types, key),
      hospitalId: ids.hospitalId,
      key,
      name,
      bodyRegion,
      typicalKvp,
      recognisedBy: [name],
    })),
  );
}

async function seedGarments(db: Db, ids: DemoIds, anchor: Date): Promise<void> {
  const end = startOfAnchorDay(anchor);
  await copyRows(
    db,
    Garment,
    demoGarments.map(({ ownerCode, lastInspectedDaysAgo, nextDueInDays, ...garment }) => ({
      id: idOf(ids.garments, garment.code),
      hospitalId: ids.hospitalId,
      ...garment,
      ownerId: ownerCode === null ? null : idOf(ids.people, ownerCode),
      lastInspectedOn: end.minus({ days: lastInspectedDaysAgo }).toISODate(),
      nextDueOn: nextDueInDays === null ? null : end.plus({ days: nextDueInDays }).toISODate(),
    })),
  );
}

/** The hospital with its people, rooms, machines, factors, types, garments and default levels. */
export async function seedHospital(db: Db, anchor: Date, passwordHash: string): Promise<DemoIds> {
  const hospitalId = newId();
  const { name, timeZone } = demoHospital;
  await addHospital(db, { id: hospitalId, name, timeZone, isDemo: true });
  const ids: DemoIds = {
    hospitalId,
    people: await seedPeople(db, hospitalId, passwordHash),
    rooms: giveIds(demoRooms.map((room) => room.code)),
    equipment: giveIds(demoEquipment.map((machine) => machine.key)),
    types: giveIds(demoProcedureTypes.map((type) => type.key)),
    garments: giveIds(demoGarments.map((garment) => garment.code)),
  };
  await addDefaultLevels(db, hospitalId);
  await seedRooms(db, ids, anchor);
  await seedTypes(db, ids);
  await seedGarments(db, ids, anchor);
  return ids;
}
