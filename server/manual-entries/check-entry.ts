import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { isFreePicture } from '../attachments/attachment.store';
import type { Db } from '../db/db';
import { findEquipment } from '../equipment/equipment.store';
import type { Hospital } from '../hospital/hospital.entity';
import { fieldProblem } from '../kernel/field-problem';
import { toInstant } from '../procedures/place-in-time';
import { findProcedureType } from '../procedure-types/procedure-type.store';
import { findRoom } from '../rooms/room.store';
import { findFigureIssues } from './find-figure-issues';

type Checked = {
  equipmentId: string | null;
  localStartedAt: string;
  quantities: TypedQuantity[];
  confirmation: TypedQuantity[];
  photoId: string | null;
};

/** Only in a new entry. */
type CheckedNew = { procedureId: string | null; roomId: string | null; procedureTypeId: string | null };

type Place = { roomId: string | null };

/** Machines, rooms, types and pictures must be of this hospital, and nothing can have been before it was. All is told at once. */
export async function checkEntry(
  tx: Db,
  hospital: Hospital,
  input: Checked & Partial<CheckedNew>,
  doseReportId: string | null,
  now: Date,
): Promise<Place> {
  const { id, timeZone } = hospital;
  const issues = findFigureIssues(input.quantities, input.confirmation);
  const expect = (isRight: boolean, pointer: string, detail: string) => {
    if (!isRight) issues.push({ pointer, detail });
  };
  const { equipmentId, roomId = null, procedureTypeId = null, photoId } = input;
  const machine = equipmentId === null ? null : await findEquipment(tx, id, equipmentId);
  const room = roomId === null ? null : await findRoom(tx, id, roomId);
  const isTypeKnown = procedureTypeId === null || (await findProcedureType(tx, id, procedureTypeId)) !== null;
  const isPlaced = input.procedureId !== null || equipmentId !== null || roomId !== null;
  expect(isPlaced, '/equipmentId', 'Choose the machine, or the room where the machine is in no list.');
  expect(equipmentId === null || machine !== null, '/equipmentId', 'Choose a machine of the list.');
  expect(roomId === null || room !== null, '/roomId', 'Choose a room of the list.');
  expect(isTypeKnown, '/procedureTypeId', 'Choose a type of the list.');
  const startedAt = toInstant(input.localStartedAt, timeZone);
  expect(startedAt !== null, '/localStartedAt', 'There is no such time.');
  expect(
    startedAt === null || startedAt <= now,
    '/localStartedAt',
    'This is still to come. Enter when the procedure began.',
  );
  const hasPicture = photoId === null || (await isFreePicture(tx, id, photoId, doseReportId));
  expect(hasPicture, '/photoId', 'The picture is no longer kept. Take it again.');
  if (issues.length > 0) throw fieldProblem(...issues);
  return { roomId: machine?.roomId ?? roomId };
}
