import { familyWords } from './families.ts'
import type { Family } from './families.ts'

interface FamilySignProps {
  family: Family
  /** Pixels at the reader's own text size; 14 beside body text. */
  size?: number
}

/**
 * A family by its shape as well as its colour: tonal balance a disc, staging a square, timbre a triangle; liking, which
 * is of no family, a ring. Decorative: the family's word stands beside it (see FamilyName).
 */
export function FamilySign({ family, size = 14 }: FamilySignProps) {
  const side = `${size / 16}rem`
  return (
    <svg
      className="family-sign"
      data-family={family}
      style={{ width: side, height: side }}
      viewBox="0 0 14 14"
      fill="currentColor"
      aria-hidden="true"
    >
      {family === 'tonal-balance' && <circle cx="7" cy="7" r="7" />}
      {family === 'staging' && <rect width="14" height="14" rx="1.5" />}
      {family === 'timbre' && <path d="M7 0.5 14 13.5H0Z" />}
      {family === 'liking' && (
        <circle cx="7" cy="7" r="5.4" fill="none" stroke="currentColor" strokeWidth="2.8" />
      )}
    </svg>
  )
}

/** The sign with its word, in the family's colour: for the selvedge, tables and the head of a rating screen. */
export function FamilyName({ family, children }: { family: Family; children?: React.ReactNode }) {
  return (
    <span className="family-name" data-family={family}>
      <FamilySign family={family} />
      <span>{children ?? familyWords[family]}</span>
    </span>
  )
}
