import { useCallback } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { z } from 'zod';
import { useKeptForm } from '../../lib/kept-form';
import { tabStorage } from '../../lib/tab-storage';
import { entryValuesSchema, type EntryValues } from './entry-values';

const keyOf = (name: string): string => `leeward-entry-draft-${name}`;

const draftSchema = z.object({ key: z.uuid(), values: entryValuesSchema });
/** With the key that makes a repeated sending the same entry. */
export type EntryDraft = z.infer<typeof draftSchema>;

/** Unsaved entries of this browser tab; null when there are none or they cannot be read. */
export function readEntryDraft(name: string): EntryDraft | null {
  const parsed = draftSchema.safeParse(tabStorage.read(keyOf(name)));
  return parsed.success ? parsed.data : null;
}

export const dropEntryDraft = (name: string): void => tabStorage.drop(keyOf(name));

export const keepEntryDraft = (name: string, draft: EntryDraft): void => tabStorage.keep(keyOf(name), draft);

/** Keeps what is typed, so that a locked screen or a quick look elsewhere costs nothing. */
export function useKeptEntry(form: UseFormReturn<EntryValues>, name: string, key: string): void {
  const keep = useCallback(
    (values: EntryValues | null) => (values ? keepEntryDraft(name, { key, values }) : dropEntryDraft(name)),
    [name, key],
  );
  useKeptForm(form, keep);
}
