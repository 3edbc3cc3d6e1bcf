import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import type { Keeping, KeepingState } from '../keeping/keeping.ts'
import type { KeptServing } from '../keeping/kept-serving.ts'

/** What became of a serving other than the one in hand, in words. Null where there is nothing to say. */
function wordsFor(kept: KeptServing): { title: string; text: string; act: 'read' | 'send' | null } {
  switch (kept.outbox?.state) {
    case 'queued':
      return {
        title: `Serving ${kept.ordinal} is saved on this phone and not sent yet`,
        text: 'It goes by itself when the network is back.',
        act: null,
      }
    case 'refused':
      return { title: `Serving ${kept.ordinal} was not taken`, text: kept.outbox.words, act: 'send' }
    case 'late':
      return {
        title: `Serving ${kept.ordinal} came after the round had closed`,
        text: 'It is kept with the round, marked as late, and not counted.',
        act: 'read',
      }
    case 'void':
      return {
        title: `Serving ${kept.ordinal} had been set aside by the steward`,
        text: 'What you sent is kept and not counted. The serving comes again at the end under another code.',
        act: 'read',
      }
    default:
      return {
        title: `Serving ${kept.ordinal} was not sent`,
        text: 'The table went on before you sent it, or it was set aside. It counts as missed; nothing stops.',
        act: 'read',
      }
  }
}

interface KeptNoticesProps {
  keeping: Keeping
  state: KeepingState
  seat: string
  /** The kept serving that has its own screen now. */
  except: string | null
}

/** Words about this seat's other servings that this phone still keeps. */
export function KeptNotices({ keeping, state, seat, except }: KeptNoticesProps) {
  const others = [...state.records.values()].filter((kept) => kept.seat === seat && kept.id !== except)
  if (others.length === 0) return null
  return (
    <div className="mb-6">
      {others.map((kept) => {
        const { title, text, act } = wordsFor(kept)
        return (
          <Notice key={kept.id} kind={act === null ? 'plain' : 'signal'} title={title} live>
            <p>{text}</p>
            {act !== null && (
              <Button
                kind="secondary"
                onClick={() => void (act === 'send' ? keeping.retry(kept.id) : keeping.discard(kept.id))}
              >
                {act === 'send' ? 'Send again' : 'I have read this'}
              </Button>
            )}
          </Notice>
        )
      })}
    </div>
  )
}
