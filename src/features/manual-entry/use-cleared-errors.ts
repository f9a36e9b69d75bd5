import { useEffect } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import type { EntryValues } from './entry-values';

/** A field that is being changed is no longer in error; both parts of a figure are one field. */
export function useClearedErrors({ subscribe, clearErrors }: UseFormReturn<EntryValues>): void {
  useEffect(
    () =>
      subscribe({
        formState: { values: true },
        callback: ({ name }) => {
          if (!name) return;
          const isFigure = name.startsWith('figures.');
          clearErrors((isFigure ? name.replace(/\.(text|unit)$/, '') : name) as keyof EntryValues);
          if (isFigure) clearErrors('root.figures');
        },
      }),
    [subscribe, clearErrors],
  );
}
