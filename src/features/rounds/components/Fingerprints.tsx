import { CopyLine } from '#src/components/ui/CopyLine.tsx'

interface FingerprintsProps {
  plan: string | null
  keyFile: string | null
}

/** The SHA-256 of both files that were written at opening. */
export function Fingerprints({ plan, keyFile }: FingerprintsProps) {
  if (!plan || !keyFile) return null
  return (
    <div className="fields">
      <CopyLine label="Fingerprint of plan.json" value={plan} />
      <CopyLine label="Fingerprint of key.json" value={keyFile} />
    </div>
  )
}
