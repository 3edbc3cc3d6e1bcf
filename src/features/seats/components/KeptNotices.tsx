import type { Descriptor } from '#shared/contracts/scorecard.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import type { Keeping, KeepingState } from '../keeping/keeping.ts'
import { openLines, type KeptServing } from '../keeping/kept-serving.ts'

type Act = 'read' | 'retry' | 'send'
interface Words {
  title: string
  text: string
  acts: readonly Act[]
}

const verbs: Record<Act, string> = { read: 'I have read this', retry: 'Send again', send: 'Send it now' }

/** What became of a serving other than the one in hand, in words and verbs. */
function wordsFor(kept: KeptServing, scorecard: readonly Descriptor[]): Words {
  const name = `Serving ${kept.ordinal}`
  switch (kept.outbox?.state) {
    case 'queued':
      return {
        title: `${name} is saved on this phone and not sent yet`,
        text: 'It goes by itself when the network is back.',
        acts: [],
      }
    case 'refused':
      return { title: `${name} was not taken`, text: kept.outbox.words, acts: ['retry', 'read'] }
    case 'late':
      return {
        title: `${name} came after the round had closed`,
        text: 'It is kept with the round, marked as late, and not counted.',
        acts: ['read'],
      }
    case 'void':
      return {
        title: `${name} had been set aside by the steward`,
        text: 'What you sent is kept and not counted. The serving comes again at the end under another code.',
        acts: ['read'],
      }
    default:
      return openLines(scorecard, kept).length === 0
        ? {
            title: `${name} is answered and not sent`,
            text: 'The table went on before you sent it. You can still send it.',
            acts: ['send', 'read'],
          }
        : {
            title: `${name} was not finished`,
            text: 'The table went on, or the serving was set aside. It counts as missed; nothing stops.',
            acts: ['read'],
          }
  }
}

interface KeptNoticesProps {
  keeping: Keeping
  state: KeepingState
  seat: string
  scorecard: readonly Descriptor[]
  /** The kept serving that has its own screen now. */
  except: string | null
}

/** Words about this seat's other servings that this phone still keeps. */
export function KeptNotices({ keeping, state, seat, scorecard, except }: KeptNoticesProps) {
  const others = [...state.records.values()].filter((kept) => kept.seat === seat && kept.id !== except)
  if (others.length === 0) return null
  return (
    <div className="mb-6">
      {others.map((kept) => {
        const { title, text, acts } = wordsFor(kept, scorecard)
        const act: Record<Act, () => Promise<void>> = {
          read: () => keeping.discard(kept.id),
          retry: () => keeping.retry(kept.id),
          send: () => keeping.submit(kept),
        }
        return (
          <Notice key={kept.id} kind={acts.length === 0 ? 'plain' : 'signal'} title={title} live>
            <p>{text}</p>
            {acts.length > 0 && (
              <div className="actions">
                {acts.map((one) => (
                  <Button key={one} kind="secondary" onClick={() => void act[one]()}>
                    {verbs[one]}
                  </Button>
                ))}
              </div>
            )}
          </Notice>
        )
      })}
    </div>
  )
}
