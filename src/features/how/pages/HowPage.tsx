import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { to } from '#src/app/paths.ts'
import { Code } from '#src/components/Code.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { Cautions } from '../components/Cautions.tsx'

interface ChapterProps {
  label: string
  heading: string
  note?: ReactNode
  children: ReactNode
}

const Chapter = ({ label, heading, note, children }: ChapterProps) => (
  <FolioSection label={label} note={note}>
    <h2 className="heading">{heading}</h2>
    <div className="reading mt-3">{children}</div>
  </FolioSection>
)

export default function HowPage() {
  return (
    <Folio>
      <FolioSection
        label="How a round works"
        note={<p>A scrim is the cloth that hides a loudspeaker in a blind test.</p>}
      >
        <PageTitle title="How a round works">
          Several people listen, none of them knows to what, and all of it is reported.
        </PageTitle>
        <p className="lead mt-6">
          One person’s first impression of an earphone mixes what they heard with what they saw, paid and
          expected. In a round a panel rates every earphone under a code. When it closes, Scrim says how far
          the listeners agreed, and what they heard, with its uncertainty.
        </p>
      </FolioSection>
      <Chapter
        label="1 · Before"
        heading="Somebody draws up a plan"
        note={<p>Scrim plays no sound. Music comes from the panel’s own source; the phone is for rating.</p>}
      >
        <p>
          An organiser names the earphones, each one a <em>unit</em>, and those present; picks the lines to be
          rated and the music; says how levels were matched and how shape and cable are hidden.
        </p>
        <p>
          Opening the round draws an order for each listener, so that every unit comes early and late alike
          and follows the others alike, and gives every serving three digits of its own. The plan and the key,
          which ties codes to units, are written to two files. Their fingerprints go public at once, so that
          neither can be changed afterwards without showing.
        </p>
      </Chapter>
      <Chapter
        label="2 · Under the cloth"
        heading="Pouches go round under codes"
        note={
          <>
            <Code code="417" size="small" label="A code" />
            <p>Where you see this weave, something is masked.</p>
          </>
        }
      >
        <p>
          A keeper behind a screen puts the codes on opaque pouches. Small panels split the key: one person
          sees units and letters, another letters and codes, and neither learns which code is which unit. A
          steward hands the pouches out, turn by turn, and sees codes only.
        </p>
        <p>
          From opening to closing, nothing that a listener or steward can fetch ties a code to a unit. The
          organiser, if they sit or steward, gets that person’s view.
        </p>
      </Chapter>
      <Chapter label="3 · Listening" heading="Each listener rates on a phone">
        <p>
          Open your seat by its QR code or link; no account is needed. Type the three digits on your pouch,
          check the seal, listen. Overall liking comes first, then one family of lines at a time. A line that
          you have not touched is unanswered, and “I can’t tell” is always an answer.
        </p>
        <p>
          What you rate is kept on your phone at each touch and sent when there is a network. Submitting locks
          it. Nobody but you sees it until the round closes, and there is no wrong answer.
        </p>
      </Chapter>
      <Chapter
        label="4 · Closing"
        heading="The key opens, once"
        note={
          <p>
            Bands of agreement are Scrim’s own, after Koo and Li 2016: below .25 hardly, to .5 a little, to
            .75 fairly, to .9 well, above as one.
          </p>
        }
      >
        <p>
          When the round closes, the file of ratings is fixed first; only then does the key open. Exclusions
          follow rules that were fixed at opening, and results are shown with and without them. Nobody is left
          out for disagreeing.
        </p>
        <p>
          Agreement is said in words with the number beside it, and where few listeners or few units leave the
          answer open, that is what is said.
        </p>
      </Chapter>
      <Chapter label="5 · The verdict" heading="What is published, and what is not">
        <p>
          A verdict says what this panel heard on that day, with those tips and that chain. It says who paid
          for each unit, what was compared and what was not tested. It gives its data by listener number and
          lets you check the fingerprints in your own browser.
        </p>
        <p>
          Under six listeners the result is informal and for those who took part; under five no figures are
          published. There are no stars, no grades and no league table.
        </p>
        <p>
          <Link to={to('home')}>Read the verdicts</Link>
        </p>
      </Chapter>
      <FolioSection label="Cautions">
        <Cautions />
      </FolioSection>
    </Folio>
  )
}
