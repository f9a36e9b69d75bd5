import { DateTime } from 'luxon';
import type { DemoPlaneTotals, DemoProcedure } from './demo-types';
import { applyDefect } from './apply-defect';
import { bookProcedures } from './book-procedures';
import { startOfAnchorDay } from './calendar';
import { drawTotals } from './draw-totals';
import { demoHospital, findEquipment, findProcedureType } from './hospital';
import { makeEvents } from './make-events';
import { makePatient } from './make-patient';
import { placeInRooms } from './place-in-rooms';
import { plantDefects } from './plant-defects';
import { demoProcedureTypes } from './procedure-types.table-data';
import { createRandom } from './random';
import { staffInRoom } from './staff-in-room';
import { totalPlanes } from './total-planes';

/** Procedures younger than this come as real files through the real intake. */
export const newestDays = 30;

/** A UUID-derived UID (PS3.5 B.2, root 2.25) from the procedure's own stream. */
function makeStudyUid(typeKey: string, index: number): string {
  const random = createRandom('uid', typeKey, index);
  let value = 0n;
  for (let word = 0; word < 4; word++)
    value = (value << 32n) | BigInt(Math.floor(random.uniform() * 2 ** 32));
  return `2.25.${value}`;
}

function planProcedures(anchor: Date) {
  const bookings = bookProcedures(anchor);
  const planned = demoProcedureTypes.flatMap((type) => {
    const ofType = bookings.filter((booking) => booking.typeKey === type.key);
    const totals = drawTotals(type, ofType);
    return ofType.map((booking, index) => ({ booking, totals: totals[index] as (typeof totals)[number] }));
  });
  return placeInRooms(planned)
    .map((placed) => ({
      placed,
      start: DateTime.fromISO(placed.booking.day, { zone: demoHospital.timeZone }).set({
        hour: Math.floor(placed.startMin / 60),
        minute: Math.floor(placed.startMin % 60),
        second: Math.floor((placed.startMin * 60) % 60),
      }),
    }))
    .sort((a, b) => a.start.toMillis() - b.start.toMillis());
}

/** Start of the newest part of the demo, at the hospital's midnight. */
export const startOfNewest = (anchor: Date): Date =>
  startOfAnchorDay(anchor).minus({ days: newestDays }).toJSDate();

/**
 * The demo's 7,356 procedures, one after another in order of start: 24 months that end where the
 * anchor's day begins in the hospital's zone. The same anchor always gives the same procedures.
 */
export function* generateProcedures(anchor: Date): Generator<DemoProcedure, void, undefined> {
  const planned = planProcedures(anchor);
  const newest = startOfNewest(anchor).getTime();
  const defects = plantDefects(
    planned.map(({ placed: { booking }, start }) => ({
      month: booking.month,
      isNewest: start.toMillis() >= newest,
      proceduresPerYear: findProcedureType(booking.typeKey).proceduresPerYear,
    })),
  );
  /** Machine → what it displayed last. */
  const displayed = new Map<string, DemoPlaneTotals[]>();
  for (const [index, { placed, start }] of planned.entries()) {
    const { booking } = placed;
    const type = findProcedureType(booking.typeKey);
    const equipment = findEquipment(type.room, booking.month);
    const studyInstanceUid = makeStudyUid(booking.typeKey, booking.index);
    const events = makeEvents({ type, equipment, placed, studyInstanceUid });
    const sound: DemoProcedure = {
      number: index + 1,
      type,
      room: type.room,
      equipment,
      month: booking.month,
      startedAt: start.toJSDate(),
      startedAtLocal: start.toFormat("yyyy-MM-dd'T'HH:mm:ss"),
      utcOffsetMin: start.offset,
      deviceClockAheadS: 0,
      isOutOfHours: booking.isOutOfHours,
      studyInstanceUid,
      accessionNumber: `MC${start.toFormat('yyLLdd')}${String(index + 1).padStart(5, '0')}`,
      studyDescription: type.name,
      operatorCode: booking.operatorCode,
      secondOperatorCode: booking.secondOperatorCode,
      traineeCode: booking.traineeCode,
      patient: makePatient(type, booking, anchor),
      planes: totalPlanes(events),
      events,
      staff: staffInRoom(type, booking),
      defect: defects[index] ?? null,
    };
    const procedure = applyDefect(sound, displayed.get(equipment.key) ?? []);
    if (procedure.planes.length > 0) displayed.set(equipment.key, procedure.planes);
    yield procedure;
  }
}
