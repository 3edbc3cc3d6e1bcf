import { Link } from 'react-router-dom'

export interface RoundStop {
  word: 'draft' | 'open' | 'closed' | 'published' | 'cancelled'
  /** Where the stop leads; none while it cannot be visited. */
  to?: string
}

interface RoundThreadProps {
  stops: RoundStop[]
  /** Where the round is: its knot is filled. */
  status: RoundStop['word']
  /** Which stop's page is shown, when that is not the round's present state. */
  shown?: RoundStop['word']
}

/** The round's thread as navigation: one line, a knot for draft, open, closed, published, the present one filled. */
export function RoundThread({ stops, status, shown }: RoundThreadProps) {
  const here = stops.findIndex((stop) => stop.word === status)
  return (
    <nav aria-label="The round">
      <ol className="round-thread">
        {stops.map((stop, nth) => {
          const current = (shown ?? status) === stop.word
          const inner = (
            <>
              <span className="round-thread-knot" aria-hidden="true" />
              <span className="round-thread-word">{stop.word}</span>
            </>
          )
          const look = { className: 'round-thread-stop', 'data-here': nth === here }
          return (
            <li key={stop.word} data-passed={nth < here}>
              {stop.to && !current ? (
                <Link to={stop.to} {...look}>
                  {inner}
                </Link>
              ) : (
                <span {...look} aria-current={current ? 'step' : undefined}>
                  {inner}
                </span>
              )}
            </li>
          )
        })}
      </ol>
    </nav>
  )
}
