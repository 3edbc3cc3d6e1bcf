import { useNavigate } from 'react-router-dom'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { to } from '#src/app/paths.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { SeatLayout } from '#src/components/layout/SeatLayout.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'

/** Two people may share one phone: the other seats of this browser, each behind a plain screen. */
export function HandOverLinks({ seat }: { seat: PanelistSeat }) {
  const navigate = useNavigate()
  if (seat.otherSeats.length === 0) return null
  return (
    <div className="mt-8 border-t border-line pt-4">
      <p className="note">This phone is shared.</p>
      {seat.otherSeats.map((other) => (
        <div key={other.id}>
          <Button
            kind="secondary"
            icon="phone"
            onClick={() =>
              void navigate(to('seat', { seat: other.id }), { replace: true, state: { handed: true } })
            }
          >
            Hand the phone to {other.label}
          </Button>
        </div>
      ))}
    </div>
  )
}

/** Hides what the person before was doing until the next one has the phone in hand. */
export function HandOverScreen({ label, onTaken }: { label: string; onTaken: () => void }) {
  return (
    <SeatLayout verb={<Button onClick={onTaken}>I am {label}</Button>}>
      <ScreenTitle>{`Hand the phone to ${label}`}</ScreenTitle>
      <p className="lead mt-3">
        Nothing that was rated before is shown. Whoever sits there goes on from here.
      </p>
    </SeatLayout>
  )
}
