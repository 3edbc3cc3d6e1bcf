import type { ReactNode } from 'react'

/** Short facts under one another: a term, and what it is. Facts without an answer are left out. */
export function Facts({ facts }: { facts: readonly (readonly [string, ReactNode])[] }) {
  return (
    <dl className="rows">
      {facts
        .filter(([, answer]) => answer !== null && answer !== undefined && answer !== '')
        .map(([term, answer]) => (
          <div key={term} className="gap-x-6 py-2 page:grid page:grid-cols-[9rem_1fr]">
            <dt className="text-14 text-muted page:pt-0.5">{term}</dt>
            <dd className="min-w-0">{answer}</dd>
          </div>
        ))}
    </dl>
  )
}
