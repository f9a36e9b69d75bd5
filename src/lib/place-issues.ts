import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiProblem } from './api-problem';

/** "/presences/2/garmentId" → "presences.2.garmentId". */
export const pointerToPath = (pointer: string): string => pointer.split('/').filter(Boolean).join('.');

/** Shows the server's issues at their fields; the first of them gets the focus. */
export function placeIssues<Values extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<Values>,
): void {
  if (!(error instanceof ApiProblem)) return;
  error.issues.forEach(({ pointer, detail }, place) =>
    setError(
      pointerToPath(pointer) as FieldPath<Values>,
      { type: 'server', message: detail },
      { shouldFocus: place === 0 },
    ),
  );
}
