import type { FieldErrors, FieldValues, Path, UseFormSetError } from 'react-hook-form'
import { CallError } from './call.ts'

/** One fault of a form, by input name with dots: `units.0.name`. */
export interface Fault {
  name: string
  message: string
}

const isLeaf = (value: object): value is { message?: unknown; type: unknown } =>
  'type' in value && typeof (value as { type: unknown }).type !== 'object'

/** All faults of a form in the order in which its fields were declared; a fault of a whole list keeps the list's name. */
export function faultsOf(errors: FieldErrors, prefix = ''): Fault[] {
  return Object.entries(errors).flatMap(([key, value]): Fault[] => {
    if (!value || typeof value !== 'object' || key === 'ref') return []
    const name = key === 'root' && prefix ? prefix : prefix ? `${prefix}.${key}` : key
    const own = isLeaf(value) && typeof value.message === 'string' && value.message !== ''
    const message = own ? [{ name, message: value.message as string }] : []
    if (isLeaf(value) && !Array.isArray(value)) return message
    return [...message, ...faultsOf(value as FieldErrors, name)]
  })
}

/**
 * Puts the faults that the server found at their inputs. Returns what could not be placed: the faults of inputs that
 * the form does not have, or the whole problem where it names none.
 */
export function placeFaults<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  has: (name: string) => boolean = () => true,
): { left: Fault[]; problem: CallError | null } {
  if (!(error instanceof CallError)) throw error
  const fields = Object.entries(error.fields)
  for (const [name, message] of fields) if (has(name)) setError(name as Path<T>, { type: 'server', message })
  const left = fields.filter(([name]) => !has(name)).map(([name, message]) => ({ name, message }))
  return { left, problem: fields.length === 0 ? error : null }
}
