import { roomSchema } from '../../../shared/contract/room';
import { useSaveRecord } from '../../lib/save-record';
import { roomsKey } from './queries';

export const useSaveRoom = (id: string | null) =>
  useSaveRecord({ path: '/api/rooms', id, schema: roomSchema, invalidates: [roomsKey] });
