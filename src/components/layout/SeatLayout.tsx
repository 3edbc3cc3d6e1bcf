import type { ReactNode } from 'react'

interface SeatLayoutProps {
  /** The code under cloth, when the listener has one in hand. */
  code?: ReactNode
  /** Where the listener is: "Serving 3 of 7", the place, the servings' progress. */
  where?: ReactNode
  children: ReactNode
  /** Quiet words at the foot: "saved on this phone · sent". */
  kept?: ReactNode
  /** The one verb, under the thumb. */
  verb?: ReactNode
}

/** A listener's screen: code on top, one matter (the frame's skip link leads to it), the verb at the bottom. */
export function SeatLayout({ code, where, children, kept, verb }: SeatLayoutProps) {
  return (
    <div className="seat">
      {(code || where) && (
        <header className="seat-head">
          {code}
          {where && <div className="seat-where">{where}</div>}
        </header>
      )}
      <main id="matter" tabIndex={-1} className="seat-main">
        {children}
      </main>
      {(kept || verb) && (
        <footer className="seat-foot">
          <div className="note" role="status">
            {kept}
          </div>
          {verb}
        </footer>
      )}
    </div>
  )
}
