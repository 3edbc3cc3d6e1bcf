import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { flushSync } from 'react-dom'
import { createPortal } from 'react-dom'
import type { PublicRound } from '#shared/contracts/rounds.ts'
import type { Tags } from '#shared/contracts/tags.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { shortRound } from '../due.ts'
import { printed, type Printed } from '../printed.ts'
import { fingerprintsQuery } from '../queries.ts'

type What = 'sheet' | 'cards'

/** A sheet for whoever tags, and cards to cut out; the screen itself is not printed. */
export function Printing({ round, tags }: { round: string; tags: Tags }) {
  const [what, setWhat] = useState<What>('cards')
  const paper = printed(tags)
  // On paper both fingerprints are out of anybody's reach; without them the sheet still serves.
  const { data: prints } = useQuery(fingerprintsQuery(round))
  const print = (wanted: What) => {
    flushSync(() => setWhat(wanted))
    window.print()
  }
  return (
    <section className="mt-8 border-t border-line pt-4 no-print">
      <h2 className="subheading">On paper</h2>
      <div className="actions">
        <Button kind="secondary" icon="print" onClick={() => print('cards')}>
          Print the cards
        </Button>
        <Button kind="secondary" icon="print" onClick={() => print('sheet')}>
          Print the sheet
        </Button>
      </div>
      <p className="note measure">
        Cards carry {tags.part === 'letters' ? 'letters' : 'digits'} and the round’s short sign, no unit. The
        sheet is for you alone: keep it behind the screen, and destroy it when the round is closed.
      </p>
      {createPortal(
        <div className="print-only">
          {what === 'cards' ? (
            <Cards paper={paper} round={round} />
          ) : (
            <Sheet paper={paper} round={round} prints={prints} />
          )}
        </div>,
        document.body,
      )}
    </section>
  )
}

function Cards({ paper, round }: { paper: Printed; round: string }) {
  return (
    <div className="print-cards">
      {paper.cards.map((sign) => (
        <div key={sign} className="print-card">
          <b>{sign}</b>
          <span>round {shortRound(round)}</span>
        </div>
      ))}
    </div>
  )
}

type Prints = Pick<PublicRound, 'planFingerprint' | 'keyFingerprint'>

function Sheet({ paper, round, prints }: { paper: Printed; round: string; prints: Prints | undefined }) {
  const codeAt = paper.head.indexOf('Code')
  return (
    <>
      <p>
        Round {shortRound(round)}. For whoever tags, for nobody else. Destroy it when the round is closed.
      </p>
      {prints && (
        <p>
          Fixed when the round opened. plan.json {prints.planFingerprint}
          <br />
          key.json {prints.keyFingerprint}
        </p>
      )}
      <table className="print-sheet">
        <thead>
          <tr>
            {paper.head.map((word) => (
              <th key={word} scope="col">
                {word}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {paper.rows.map((row) => (
            <tr key={row.join(' ')}>
              {row.map((cell, nth) => (
                <td key={nth}>{nth === codeAt ? <b>{cell}</b> : cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </>
  )
}
