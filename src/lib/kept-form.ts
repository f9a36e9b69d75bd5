import { useEffect } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';

/**
 * Tells what is typed into a form after every change, and null once nothing differs from what it opened with: for a
 * draft that outlives a locked screen or a quick look elsewhere.
 */
export function useKeptForm<Values extends FieldValues, Output>(
  form: UseFormReturn<Values, unknown, Output>,
  keep: (values: Values | null) => void,
): void {
  const { subscribe } = form;
  useEffect(
    () =>
      subscribe({
        formState: { values: true, isDirty: true },
        callback: ({ values, isDirty, defaultValues }) => {
          const isChanged = isDirty ?? JSON.stringify(values) !== JSON.stringify(defaultValues);
          keep(isChanged ? values : null);
        },
      }),
    [subscribe, keep],
  );
}
