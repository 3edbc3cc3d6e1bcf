import { ApiError, notFound } from './api-error.ts'

/** Goes on only where the policy said yes. Without any sight of the record, its existence is not told either. */
export function permit(allowed: boolean, what: { seen?: boolean; detail?: string } = {}): void {
  if (allowed) return
  if (what.seen === false) throw notFound()
  throw new ApiError('forbidden', what.detail ?? 'Your role in this round does not allow this.')
}
