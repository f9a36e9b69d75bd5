import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { roomInputSchema, type Room } from '../../../shared/contract/room';
import { Checkbox } from '../../ui/checkbox';
import { FieldGroup } from '../../ui/field-group';
import { RecordForm } from '../../ui/record-form';
import { TextArea, TextField } from '../../ui/text-field';
import { useSaveRoom } from './mutations';
import { describeRoom, newRoom, readCurrentRoom, toRoomInput } from './room-values';

type RoomFormProps = { room: Room | null; backTo: string; onSaved: (room: Room) => void };

export function RoomForm({ room, backTo, onSaved }: RoomFormProps) {
  const form = useForm({
    resolver: zodResolver(roomInputSchema),
    defaultValues: room ? toRoomInput(room) : newRoom,
  });
  const { errors } = form.formState;
  return (
    <RecordForm
      form={form}
      save={useSaveRoom(room?.id ?? null)}
      onSaved={onSaved}
      saveText={room ? 'Save' : 'Add this room'}
      backTo={backTo}
      readCurrent={readCurrentRoom}
      describe={describeRoom}
    >
      <FieldGroup>
        <TextField
          label="Code"
          hint="Short, as on the door: it stands in every list."
          autoComplete="off"
          {...form.register('code')}
          error={errors.code?.message}
        />
        <TextField label="Name" autoComplete="off" {...form.register('name')} error={errors.name?.message} />
        <TextArea
          label="Note"
          isOptional
          rows={3}
          className="sm:col-span-2"
          {...form.register('note')}
          error={errors.note?.message}
        />
        <Checkbox
          label="In use"
          hint="A room that is closed keeps its procedures and is no longer offered."
          className="sm:col-span-2"
          {...form.register('isActive')}
        />
      </FieldGroup>
    </RecordForm>
  );
}
