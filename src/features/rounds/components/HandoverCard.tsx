import type { Handover } from '#shared/contracts/rounds.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { CopyLine } from '#src/components/ui/CopyLine.tsx'
import { QrCode } from '#src/components/ui/QrCode.tsx'
import { useRenewLink, type At } from '../queries.ts'

interface HandoverCardProps {
  at: At
  handover: Handover
}

/** One link to hand over: whom it is for, its QR code, its address. */
export function HandoverCard({ at, handover }: HandoverCardProps) {
  const renew = useRenewLink(at)
  const { label, url, qr, opened, what } = handover
  return (
    <li className="keep-together grid gap-x-6 gap-y-3 py-6 page:grid-cols-[10rem_1fr]">
      <div>
        <QrCode svg={qr} label={`${label}, opens ${what === 'seat' ? 'the seat' : 'the duty'} on a phone`} />
      </div>
      <div className="min-w-0">
        <h2 className="heading">{label}</h2>
        <p className="note">
          {what === 'seat' ? 'Listens' : 'Has a duty'} · {opened ? 'opened on a phone' : 'not opened yet'}
        </p>
        <div className="mt-2">
          <CopyLine label={`Link for ${label}`} value={url} />
        </div>
        <Button
          kind="secondary"
          busy={renew.isPending}
          busyLabel="Making a new link"
          onClick={() => renew.mutate(handover.id)}
          aria-label={`Make a new link for ${label}`}
        >
          Make a new link
        </Button>
        {renew.isSuccess && (
          <p role="status" className="note">
            The old link no longer works.
          </p>
        )}
      </div>
    </li>
  )
}
