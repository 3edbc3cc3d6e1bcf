import type { KeepingState } from './keeping/keeping.ts'
import type { KeptServing } from './keeping/kept-serving.ts'

/** The quiet words at the foot: whether what was touched is kept, and whether it is sent. */
export function keptWords(state: KeepingState, kept: KeptServing | undefined): string {
  if (!state.durable) {
    const words = 'this browser does not let Scrim save: do not close this page'
    return kept?.outbox ? `${words} · not sent yet` : words
  }
  if (!kept) return ''
  if (state.saving) return 'saving'
  if (kept.outbox?.state !== 'queued') return 'saved on this phone'
  return state.sending ? 'saved on this phone · sending' : 'saved on this phone · not sent yet'
}
