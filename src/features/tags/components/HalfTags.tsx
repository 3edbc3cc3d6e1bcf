import type { Tags } from '#shared/contracts/tags.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Code } from '#src/components/Code.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import type { AtTags } from '../queries.ts'
import { useMark } from '../use-mark.ts'
import { PouchView } from './PouchView.tsx'

export type LetterTags = Extract<Tags, { part: 'letters' }>
export type CodeTags = Extract<Tags, { part: 'codes' }>

/** First half of a split key: units into lettered pouches, alone. No code is known here. */
export function LetterTagsView({ at, tags }: { at: AtTags; tags: LetterTags }) {
  const mark = useMark(at)
  const due = tags.pouches.find(({ done }) => !done)
  const done = tags.pouches.filter((pouch) => pouch.done).length
  return (
    <>
      <p className="note mb-3">
        {done} of {tags.pouches.length} in their pouches. Do this alone, and tell nobody which letter holds
        which pair.
      </p>
      {due ? (
        <>
          <PouchView above={due.unit} beside={due.maker} sign={due.letter} signName="Letter" />
          <div className="pouch-foot no-print">
            <Button
              onClick={() => mark.mutate({ letter: due.letter })}
              busy={mark.isPending}
              busyLabel="Noting it"
            >
              In pouch {due.letter}
            </Button>
          </div>
        </>
      ) : (
        <Notice kind="done" title="Every pair is in its lettered pouch">
          Leave the pouches closed for the one who puts the codes on, and leave the room.
        </Notice>
      )}
      {mark.error && <Problem error={mark.error} kept="The pouch is still to do." />}
      <ul className="rows mt-8">
        {tags.pouches.map((pouch) => (
          <li key={pouch.letter} className="pouch-line">
            <Code code={pouch.letter} size="small" />
            <span>
              {pouch.unit} <span className="text-muted">{pouch.maker}</span>
            </span>
            <span className="note">{pouch.done ? 'done' : 'to do'}</span>
          </li>
        ))}
      </ul>
    </>
  )
}

/** Second half of a split key: codes over the letters, alone. No unit is known here. */
export function CodeTagsView({ at, tags }: { at: AtTags; tags: CodeTags }) {
  const mark = useMark(at)
  const due = tags.pouches.find(({ done }) => !done)
  const done = tags.pouches.filter((pouch) => pouch.done).length
  return (
    <>
      <p className="note mb-3">
        {done} of {tags.pouches.length} tagged. Do this alone: cover the letter, put the code over it, do not
        look inside.
      </p>
      {due ? (
        <>
          <PouchView above={`Pouch ${due.letter}`} sign={due.code} signName="Code" />
          <div className="pouch-foot no-print">
            <Button
              onClick={() => mark.mutate({ letter: due.letter })}
              busy={mark.isPending}
              busyLabel="Noting it"
            >
              Tagged
            </Button>
          </div>
        </>
      ) : (
        <Notice kind="done" title="Every pouch has its code">
          Letters are covered from here on. Keep the reserve codes at hand.
        </Notice>
      )}
      {mark.error && <Problem error={mark.error} kept="The pouch is still to tag." />}
      <ul className="rows mt-8">
        {tags.pouches.map((pouch) => (
          <li key={pouch.letter} className="pouch-line">
            <Code code={pouch.code} size="small" />
            <span>
              over letter {pouch.letter} <span className="text-muted">· in reserve {pouch.reserve}</span>
            </span>
            <span className="note">{pouch.done ? 'tagged' : 'to tag'}</span>
          </li>
        ))}
      </ul>
    </>
  )
}
