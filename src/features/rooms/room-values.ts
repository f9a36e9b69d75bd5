import { roomSchema, type Room, type RoomInput } from '../../../shared/contract/room';

export const newRoom: RoomInput = { code: '', name: '', note: '', isActive: true };

export const toRoomInput = ({ id: _id, ...room }: Room): RoomInput => room;

export function readCurrentRoom(current: unknown): RoomInput | null {
  const parsed = roomSchema.safeParse(current);
  return parsed.success ? toRoomInput(parsed.data) : null;
}

export const describeRoom = (room: RoomInput) => [
  { name: 'Code', value: room.code },
  { name: 'Name', value: room.name },
  { name: 'Note', value: room.note || 'none' },
  { name: 'In use', value: room.isActive ? 'yes' : 'no' },
];
