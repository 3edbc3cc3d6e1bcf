import type { FieldValues, UseFormSetError } from 'react-hook-form'
import { CallError } from '#src/lib/call.ts'
import { placeFaults } from '#src/lib/form-faults.ts'

/** Puts a failed call's faults at their inputs; returns what is left to show for the whole form, or null. */
export function unplaced<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  has: (field: string) => boolean,
): unknown {
  if (!(error instanceof CallError)) return error
  const { left, problem } = placeFaults(error, setError, has)
  return left.length > 0 ? error : problem
}
