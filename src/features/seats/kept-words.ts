import type { KeepingState } from './keeping/keeping.ts'
import type { KeptServing } from './keeping/kept-serving.ts'

/** The quiet words at the foot: whether what was touched is kept, and whether it is sent. */
export function keptWords(state: KeepingState, kept: KeptServing | undefined): string {
  const place = state.durable
    ? 'saved on this phone'
    : 'kept only while this page is open: this browser does not let Scrim save'
  if (kept?.outbox?.state === 'queued')
    return state.sending ? `${place} · sending` : `${place} · not sent yet`
  if (!kept) return state.durable ? '' : 'this browser does not let Scrim save: do not close this page'
  return state.saving && state.durable ? 'saving' : place
}
