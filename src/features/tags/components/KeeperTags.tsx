import { Problem } from '#src/components/asked/Problem.tsx'
import { Code } from '#src/components/Code.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Disclosure } from '#src/components/ui/Disclosure.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { dueInOrder, heldBy, pouchWords, taggedIn, turnsOf, type KeeperTags, type Pouch } from '../due.ts'
import type { AtTags } from '../queries.ts'
import { useMark } from '../use-mark.ts'
import { PouchView } from './PouchView.tsx'

/** The keeper's pouches, turn by turn: what is due now, one at a time. */
export function KeeperTagsView({ at, tags }: { at: AtTags; tags: KeeperTags }) {
  const mark = useMark(at)
  const [due, ...later] = dueInOrder(tags.pouches)
  const held = due && heldBy(due, tags.pouches)
  const turn = due?.turn ?? tags.turn
  const progress = taggedIn(tags.pouches, turn)
  return (
    <>
      <p className="note mb-3">
        The table is at turn {tags.turn} of {tags.turns}.{' '}
        {due && `For turn ${due.turn}: ${progress.tagged} of ${progress.of} tagged.`}
      </p>
      {due ? (
        <>
          <PouchView
            above={due.unit}
            beside={due.maker}
            sign={due.code}
            signName="Code"
            below={`for ${due.seat}, turn ${due.turn}`}
          />
          <div className="pouch-foot no-print">
            <Button
              onClick={() => mark.mutate({ serving: due.serving })}
              busy={mark.isPending}
              busyLabel="Noting it"
              disabledReason={
                held
                  ? held.state === 'out'
                    ? `This pair is still with ${held.seat} under ${held.code}. It can be tagged when it is back.`
                    : `This pair waits under ${held.code} for turn ${held.turn}. Tag it after that turn.`
                  : null
              }
            >
              Tagged
            </Button>
            {later[0] && later[0].turn === due.turn && <span className="note">then {later[0].unit}</span>}
          </div>
        </>
      ) : (
        <Notice kind="done" title="Every pouch is tagged">
          Stay near: a serving that is set aside comes back here under a reserve code.
        </Notice>
      )}
      {mark.error && <Problem error={mark.error} kept="The pouch is still to tag." />}
      <div className="mt-8">
        {turnsOf(tags.pouches).map((each) => (
          <Turn key={each} turn={each} open={each === turn} pouches={tags.pouches} />
        ))}
        {tags.reserves.length > 0 && (
          <Disclosure summary="Reserve codes, for servings set aside">
            <ul className="rows">
              {tags.reserves.map((pouch) => (
                <li key={pouch.code} className="pouch-line">
                  <Code code={pouch.code} size="small" />
                  <span>
                    {pouch.unit} <span className="text-muted">{pouch.maker}</span>
                  </span>
                  <span className="note">{pouch.seat}</span>
                </li>
              ))}
            </ul>
          </Disclosure>
        )}
      </div>
    </>
  )
}

function Turn({ turn, open, pouches }: { turn: number; open: boolean; pouches: readonly Pouch[] }) {
  const { tagged, of } = taggedIn(pouches, turn)
  return (
    <Disclosure summary={`Turn ${turn}: ${tagged} of ${of} tagged`} open={open}>
      <ul className="rows">
        {pouches
          .filter((pouch) => pouch.turn === turn)
          .map((pouch) => (
            <li key={pouch.serving} className="pouch-line">
              <Code code={pouch.code} size="small" />
              <span>
                {pouch.unit} <span className="text-muted">for {pouch.seat}</span>
              </span>
              <span className="note">{pouchWords[pouch.state]}</span>
            </li>
          ))}
      </ul>
    </Disclosure>
  )
}
