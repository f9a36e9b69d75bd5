import { useEffect } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { recordSchema, type RecordInput } from '../../../shared/contract/record';

const keyOf = (procedureId: string): string => `leeward-record-draft-${procedureId}`;

/** Entries change shape while they are typed: only the list of fields must be the record's own. */
const isRecordLike = (value: unknown): value is RecordInput =>
  typeof value === 'object' &&
  value !== null &&
  Array.isArray((value as RecordInput).presences) &&
  Object.keys(value).every((field) => field === 'reason' || field in recordSchema.shape);

/** Unsaved entries of this browser tab; null when there are none or they cannot be read. */
export function readDraft(procedureId: string): RecordInput | null {
  try {
    const parsed: unknown = JSON.parse(sessionStorage.getItem(keyOf(procedureId)) ?? 'null');
    return isRecordLike(parsed) ? parsed : null;
  } catch {
    return null;
  }
}

export function dropDraft(procedureId: string): void {
  try {
    sessionStorage.removeItem(keyOf(procedureId));
  } catch {
    // Closed storage holds no draft either.
  }
}

function keepDraft(procedureId: string, values: RecordInput): void {
  try {
    sessionStorage.setItem(keyOf(procedureId), JSON.stringify(values));
  } catch {
    // Closed or full storage: the entries stay in the form only.
  }
}

/** Keeps what is typed, so that a locked screen or a quick look elsewhere costs nothing. */
export function useKeptDraft<Output>(
  form: UseFormReturn<RecordInput, unknown, Output>,
  procedureId: string,
): void {
  const { subscribe } = form;
  useEffect(
    () =>
      subscribe({
        formState: { values: true, isDirty: true },
        callback: ({ values, isDirty, defaultValues }) => {
          const isChanged = isDirty ?? JSON.stringify(values) !== JSON.stringify(defaultValues);
          if (isChanged) keepDraft(procedureId, values);
          else dropDraft(procedureId);
        },
      }),
    [subscribe, procedureId],
  );
}
