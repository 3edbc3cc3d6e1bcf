import type { VerdictDraft } from '#shared/contracts/verdicts.ts'
import { Notice } from '#src/components/ui/Notice.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'

/** Goes to an entry of the desk and gives it focus. */
function goTo(field: string): void {
  const entry = document.getElementById(field)
  const target = entry?.matches('fieldset') ? (entry.querySelector<HTMLElement>('input') ?? entry) : entry
  target?.focus()
  target?.scrollIntoView?.({ block: 'center' })
}

/** What is still asked before publishing, each line a way to its entry. */
export function StillMissing({ missing }: { missing: VerdictDraft['missing'] }) {
  if (missing.length === 0) return <Notice kind="done" title="Nothing is missing." />
  return (
    <>
      <p className="font-semibold">{sentenceCase(counted(missing.length, 'thing'))} still missing</p>
      <ul className="mt-2">
        {missing.map(({ field, what }) => (
          <li key={`${field} ${what}`}>
            <a
              href={`#${field}`}
              className="inline-block py-2"
              onClick={(event) => {
                event.preventDefault()
                goTo(field)
              }}
            >
              {what}
            </a>
          </li>
        ))}
      </ul>
    </>
  )
}
