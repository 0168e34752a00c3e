import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiProblem } from '@/app/_api';

/**
 * Shows a refusal of our API at the fields it names and goes to the first. Fields of a form are named as
 * in the input they make, so that the paths fit.
 */
export function showAtFields<T extends FieldValues>(
  setError: UseFormSetError<T>,
  refusal: unknown,
): void {
  const fields = refusal instanceof ApiProblem ? refusal.fields : [];
  fields.forEach(({ path, message }, index) => {
    setError(path as FieldPath<T>, { message }, { shouldFocus: index === 0 });
  });
}
