import { useEffect } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { z } from 'zod';
import { entryValuesSchema, type EntryValues } from './entry-values';

const prefix = 'leeward-entry-draft-';

const draftSchema = z.object({ key: z.uuid(), values: entryValuesSchema });
/** With the key that makes a repeated sending the same entry. */
export type EntryDraft = z.infer<typeof draftSchema>;

/** Unsaved entries of this browser tab; null when there are none or they cannot be read. */
export function readEntryDraft(name: string): EntryDraft | null {
  try {
    const parsed = draftSchema.safeParse(JSON.parse(sessionStorage.getItem(prefix + name) ?? 'null'));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

export function dropEntryDraft(name: string): void {
  try {
    sessionStorage.removeItem(prefix + name);
  } catch {
    // Closed storage holds no draft either.
  }
}

export function keepEntryDraft(name: string, draft: EntryDraft): void {
  try {
    sessionStorage.setItem(prefix + name, JSON.stringify(draft));
  } catch {
    // Closed or full storage: the entries stay in the form only.
  }
}

/** Keeps what is typed, so that a locked screen or a quick look elsewhere costs nothing. */
export function useKeptEntry(form: UseFormReturn<EntryValues>, name: string, key: string): void {
  const { subscribe } = form;
  useEffect(
    () =>
      subscribe({
        formState: { values: true, isDirty: true },
        callback: ({ values, isDirty, defaultValues }) => {
          const isChanged = isDirty ?? JSON.stringify(values) !== JSON.stringify(defaultValues);
          if (isChanged) keepEntryDraft(name, { key, values });
          else dropEntryDraft(name);
        },
      }),
    [subscribe, name, key],
  );
}
