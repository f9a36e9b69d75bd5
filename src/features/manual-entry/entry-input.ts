import type {
  ManualEntryCorrection,
  NewManualEntry,
  TypedQuantity,
} from '../../../shared/contract/manual-entry';
import { listFigures, toTyped, unlistedMachine, type EntryValues } from './entry-values';

const machineOf = ({ equipmentId }: EntryValues) =>
  equipmentId === '' || equipmentId === unlistedMachine ? null : equipmentId;

const toFields = (values: EntryValues, confirmation: TypedQuantity[]) => ({
  equipmentId: machineOf(values),
  localStartedAt: values.localStartedAt,
  quantities: listFigures(values).map(toTyped),
  confirmation,
  photoId: values.photo?.id ?? null,
  comment: values.comment,
});

/** The form's values as the server takes them. */
export const toNewEntry = (
  values: EntryValues,
  confirmation: TypedQuantity[],
  { key, procedureId }: { key: string; procedureId: string | null },
): NewManualEntry => ({
  ...toFields(values, confirmation),
  key,
  procedureId,
  roomId: machineOf(values) === null ? values.roomId || null : null,
  procedureTypeId: values.procedureTypeId,
  patient: { id: values.patientId, name: values.patientName, accessionNumber: values.accessionNumber },
});

export const toCorrection = (
  values: EntryValues,
  confirmation: TypedQuantity[],
  version: number,
): ManualEntryCorrection => ({ ...toFields(values, confirmation), reason: values.reason, version });
