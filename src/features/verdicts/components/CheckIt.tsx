import { useMutation } from '@tanstack/react-query'
import type { Check } from '#shared/allocation/types.ts'
import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { Icon } from '#src/components/Icon.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { CopyLine } from '#src/components/ui/CopyLine.tsx'
import { Failure } from '#src/components/ui/Failure.tsx'
import { checkedWords, checkVerdict } from '../check-files.ts'

function CheckList({ checks }: { checks: Check[] }) {
  return (
    <div className="mt-6">
      <p className="font-semibold">{checkedWords(checks)}</p>
      <ul className="rows mt-2">
        {checks.map((check) => (
          <li key={check.name} className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-3 py-2">
            <span className={check.ok ? 'text-done' : 'text-signal'}>
              <Icon name={check.ok ? 'check' : 'alert'} />
            </span>
            <span>
              {check.name}: <strong className="font-semibold">{check.ok ? 'passed' : 'failed'}</strong>
              <span className="note block break-words">{check.detail}</span>
            </span>
          </li>
        ))}
      </ul>
    </div>
  )
}

const prints: [keyof PublicVerdict['fingerprints'], string][] = [
  ['plan', 'Fingerprint of the plan'],
  ['key', 'Fingerprint of the key'],
  ['ratings', 'Fingerprint of the ratings'],
]

/** The fingerprints, and the reader's own check of them. Nothing is asked of Scrim but the files. */
export function CheckIt({ verdict }: { verdict: PublicVerdict }) {
  const checking = useMutation({ mutationFn: () => checkVerdict(verdict) })
  const known = prints.filter(([name]) => verdict.fingerprints[name] !== null)
  if (known.length === 0) return null
  const drawn = verdict.fingerprints.key !== null
  return (
    <FolioSection
      label="Fingerprints"
      note={
        <>
          <p>
            A fingerprint is the SHA-256 of a file’s bytes. Without Scrim: save a file and run{' '}
            <code>sha256sum key.json</code>.
          </p>
          {drawn && (
            <p>
              Plan and key were fixed when the round opened, the ratings when it closed, before the key
              opened.
            </p>
          )}
        </>
      }
    >
      <h2 className="heading mb-3">Check it yourself</h2>
      <p className="measure">
        {drawn
          ? 'Your browser fetches the files, computes their fingerprints, looks every published row up in the key, and repeats the draw from the published seed.'
          : 'Your browser fetches the ratings and computes their fingerprint. Scrim drew no codes for this round, so there is no key to check.'}
      </p>
      <div className="mt-4 space-y-4">
        {known.map(([name, words]) => (
          <CopyLine key={name} label={words} value={verdict.fingerprints[name] ?? ''} />
        ))}
      </div>
      <div className="mt-6">
        <Button
          kind="secondary"
          icon="key"
          onClick={() => checking.mutate()}
          busy={checking.isPending}
          busyLabel="Checking"
        >
          Check it
        </Button>
      </div>
      <div aria-live="polite">
        {checking.data && <CheckList checks={checking.data} />}
        {checking.error && (
          <div className="mt-6">
            <Failure
              what="The check could not be made."
              todo={checking.error.message}
              onRetry={() => checking.mutate()}
              retrying={checking.isPending}
            />
          </div>
        )}
      </div>
    </FolioSection>
  )
}
