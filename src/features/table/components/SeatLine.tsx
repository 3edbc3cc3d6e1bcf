import type { StewardTable } from '#shared/contracts/table.ts'
import { Code } from '#src/components/Code.tsx'
import { Icon } from '#src/components/Icon.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { VisuallyHidden } from '#src/components/ui/VisuallyHidden.tsx'
import { seatState, ticksOf, type TableSeat } from '../state-words.ts'

interface SeatLineProps {
  seat: TableSeat
  sitting: StewardTable['sitting']
  now: number
  onMore: () => void
}

/** One line of the run sheet: who, the code, what the seat is doing. */
export function SeatLine({ seat, sitting, now, onMore }: SeatLineProps) {
  const { words, kind } = seatState(seat, sitting, now)
  const ticks = ticksOf(seat)
  const rests = sitting.turn > 0 && !sitting.ended && !seat.left && seat.serving === null
  return (
    <li className="run-seat">
      <div className="run-code">
        {seat.serving ? (
          <Code code={seat.serving.code} size="steward" label="Code" />
        ) : (
          <span className="run-code-none">{rests ? 'rest' : 'no code'}</span>
        )}
      </div>
      <div className="run-body">
        <div className="run-who">{seat.label}</div>
        <div className="run-state" data-kind={kind}>
          <span className="run-words">
            {kind === 'signal' && <Icon name="alert" size={16} />}
            {kind === 'done' && <Icon name="check" size={16} />}
            <span>{words}</span>
          </span>
          {ticks.length > 0 && (
            <span className="run-ticks">
              {ticks.map((tick) => (
                <span key={tick} className="run-words">
                  <Icon name="check" size={14} />
                  {tick}
                </span>
              ))}
            </span>
          )}
        </div>
        <div className="run-more">
          <Button kind="secondary" onClick={onMore}>
            More <VisuallyHidden>for {seat.label}</VisuallyHidden>
          </Button>
        </div>
      </div>
    </li>
  )
}
