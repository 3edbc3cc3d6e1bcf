import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Cloth } from '../Cloth.tsx'
import { Mark } from '../Mark.tsx'

/** Sign-in and its kin: the form stands in the selvedge's column, the rest is cloth with the mark. */
export function Threshold({ children }: { children: ReactNode }) {
  return (
    <div className="threshold">
      <div className="threshold-cloth clothed">
        <Cloth />
        <span className="threshold-mark">
          <Mark size={72} />
        </span>
      </div>
      <main id="matter" tabIndex={-1} className="threshold-matter">
        <p className="threshold-name">
          <Link to="/">Scrim</Link>
          <span className="note"> Blind listening, openly reported.</span>
        </p>
        {children}
      </main>
    </div>
  )
}
