import { useCallback } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { recordSchema, type RecordInput } from '../../../shared/contract/record';
import { useKeptForm } from '../../lib/kept-form';
import { tabStorage } from '../../lib/tab-storage';

const keyOf = (procedureId: string): string => `leeward-record-draft-${procedureId}`;

/** Entries change shape while they are typed: only the list of fields must be the record's own. */
const isRecordLike = (value: unknown): value is RecordInput =>
  typeof value === 'object' &&
  value !== null &&
  Array.isArray((value as RecordInput).presences) &&
  Object.keys(value).every((field) => field === 'reason' || field in recordSchema.shape);

/** Unsaved entries of this browser tab; null when there are none or they cannot be read. */
export function readDraft(procedureId: string): RecordInput | null {
  const kept = tabStorage.read(keyOf(procedureId));
  return isRecordLike(kept) ? kept : null;
}

export const dropDraft = (procedureId: string): void => tabStorage.drop(keyOf(procedureId));

/** Keeps what is typed, so that a locked screen or a quick look elsewhere costs nothing. */
export function useKeptDraft<Output>(
  form: UseFormReturn<RecordInput, unknown, Output>,
  procedureId: string,
): void {
  const keep = useCallback(
    (values: RecordInput | null) =>
      values ? tabStorage.keep(keyOf(procedureId), values) : dropDraft(procedureId),
    [procedureId],
  );
  useKeptForm(form, keep);
}
