import type { FieldErrors, FieldValues, Path, UseFormSetError } from 'react-hook-form'
import { CallError } from './call.ts'

/** One fault of a form; `field` is the input's name with dots, `units.0.name`, which is also its entry's id. */
export interface Fault {
  field: string
  message: string
}

const ownKeys = new Set(['ref', 'message', 'type', 'types'])

/** All faults of a form in the order of its fields; a fault of a whole list keeps the list's name. */
export function faultsOf(errors: FieldErrors, prefix = ''): Fault[] {
  return Object.entries(errors).flatMap(([key, value]): Fault[] => {
    if (!value || typeof value !== 'object' || ownKeys.has(key)) return []
    const field = [prefix, key].filter((part) => part !== '' && !(part === 'root' && prefix !== '')).join('.')
    const { message } = value as { message?: unknown }
    const own = typeof message === 'string' && message !== '' ? [{ field, message }] : []
    return [...own, ...faultsOf(value as FieldErrors, field)]
  })
}

/** What the server said that no single input can show. */
export interface Unplaced {
  left: Fault[]
  problem: CallError | null
}

/**
 * Puts the faults that the server found at their inputs. Returns what could not be placed: the faults of inputs that
 * the form does not have, or the whole problem where it names none.
 */
export function placeFaults<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  has: (field: string) => boolean = () => true,
): Unplaced {
  if (!(error instanceof CallError)) throw error
  const told = Object.entries(error.fields).map(([field, message]) => ({ field, message }))
  for (const { field, message } of told)
    if (has(field)) setError(field as Path<T>, { type: 'server', message })
  return { left: told.filter(({ field }) => !has(field)), problem: told.length === 0 ? error : null }
}
