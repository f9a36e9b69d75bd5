import type { DemoEquipment, DemoProcedureType, DemoRoomCode } from './demo-types';
import { demoProcedureTypes } from './procedure-types.table-data';
import { demoEquipment } from './rooms.table-data';

/** An invented hospital: no institution of this name is meant. Its clock runs on Mountain Time. */
export const demoHospital = {
  name: 'Marrow Creek Regional Hospital',
  timeZone: 'America/Denver',
  mailDomain: 'marrowcreek.example',
} as const;

/** Months that the demo covers, the last one ending at the anchor. */
export const demoMonths = 24;

export function findProcedureType(key: string): DemoProcedureType {
  const type = demoProcedureTypes.find((candidate) => candidate.key === key);
  if (!type) throw new Error(`No procedure type ${key}.`);
  return type;
}

/** The machine that stood in a room in a month (1 to 24). */
export function findEquipment(room: DemoRoomCode, month: number): DemoEquipment {
  const machine = demoEquipment.find(
    (candidate) =>
      candidate.room === room &&
      (candidate.fromMonth ?? 0) <= month &&
      month <= (candidate.toMonth ?? Number.POSITIVE_INFINITY),
  );
  if (!machine) throw new Error(`No machine in ${room} in month ${month}.`);
  return machine;
}
