import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ApiError } from './api.ts';

/** Marks the fields that the server refused; the first of them takes the focus. The words stand beside the field. */
export function markFaults<Values extends FieldValues>(error: unknown, setError: UseFormSetError<Values>): void {
  if (!(error instanceof ApiError)) return;
  error.fields.forEach(({ field }, index) => {
    setError(field as Path<Values>, { type: 'server' }, { shouldFocus: index === 0 });
  });
}
