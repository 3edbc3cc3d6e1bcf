import type { ReactNode } from 'react'
import { Link, NavLink } from 'react-router-dom'
import { Mark } from '../Mark.tsx'

export interface TopLink {
  to: string
  word: string
  /** Present only on exactly this address. */
  end?: boolean
}

interface TopLineProps {
  /** Where the name leads. */
  home?: string
  links: TopLink[]
  /** Who is here, or the way in: "The Quayside Bench · Ines Falk". */
  who?: ReactNode
}

/** The line on top: mark and name, the places, who. */
export function TopLine({ home = '/', links, who }: TopLineProps) {
  return (
    <header className="top-line">
      <div className="top-line-inner">
        <Link to={home} className="top-line-name">
          <Mark />
          <span>Scrim</span>
        </Link>
        {links.length > 0 && (
          <nav aria-label="Places" className="top-line-links">
            {links.map((link) => (
              <NavLink key={link.to} to={link.to} end={link.end} className="top-line-link">
                {link.word}
              </NavLink>
            ))}
          </nav>
        )}
        {who && <div className="top-line-who">{who}</div>}
      </div>
    </header>
  )
}
