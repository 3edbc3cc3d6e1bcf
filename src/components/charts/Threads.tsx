import type { Family } from '../families.ts'
import { DataTable } from '../ui/DataTable.tsx'
import { ChartFrame } from './ChartFrame.tsx'
import type { ChartWords } from './ChartFrame.tsx'
import type { HeardScale } from './geometry/heard-line.ts'
import { layOutThreads } from './geometry/threads.ts'
import type { ThreadUnit } from './geometry/threads.ts'
import { printed } from './number-words.ts'
import { ThreadsPicture } from './ThreadsPicture.tsx'
import { useLifted } from './useLifted.ts'

interface ThreadsProps extends ChartWords {
  family: Family
  scale: HeardScale
  /** In any order; the picture orders them by mean. */
  units: ThreadUnit[]
  /** What each listener is called, in the order of the units' scores: "Listener 7", "You". */
  listeners: string[]
  decimals?: number
  /** A listener to keep lifted when none is pointed at: one's own thread. */
  own?: number
}

/**
 * Threads: units in order of their mean, one thin line per listener, the panel's line bold. Parallel is agreement, a
 * tangle is none. Pointing at a thread, or the arrow keys, lifts one and says its numbers.
 */
export function Threads({ family, scale, units, listeners, decimals = 0, own, ...words }: ThreadsProps) {
  const { lifted, setLifted, keys } = useLifted(listeners.length)
  const shown = lifted ?? own ?? null
  const ordered = [...units].sort((a, b) => a.mean - b.mean)
  const said =
    shown === null
      ? 'Point at a thread, touch it, or use the arrow keys, to follow one listener.'
      : `${listeners[shown]}: ${ordered
          .map((unit) => {
            const score = unit.scores[shown]
            return `${unit.name} ${score === null || score === undefined ? 'not rated' : printed(score, decimals)}`
          })
          .join(', ')}`
  return (
    <ChartFrame
      {...words}
      family={family}
      table={
        <DataTable
          caption={words.title}
          captionHidden
          density="close"
          stays
          rows={[
            { name: 'The panel’s mean', scores: ordered.map((unit) => unit.mean) },
            ...listeners.map((name, nth) => ({
              name,
              scores: ordered.map((unit) => unit.scores[nth] ?? null),
            })),
          ]}
          rowKey={(row) => row.name}
          columns={[
            { key: 'listener', header: 'Listener', cell: (row) => row.name },
            ...ordered.map((unit, nth) => ({
              key: unit.name,
              header: unit.name,
              numeric: true,
              cell: (row: { scores: (number | null)[] }) => {
                const score = row.scores[nth]
                return score === null || score === undefined ? '–' : printed(score, decimals)
              },
            })),
          ]}
        />
      }
      reading="Each thin line is one listener, the bold one the panel. Where the lines run side by side, people agree on the order of the units; where they cross, they do not."
    >
      {(width) => {
        const layout = layOutThreads(units, scale, width)
        return (
          <>
            {/* One stop in the tab order; arrows walk through the threads and the line below says them. */}
            <div
              role="group"
              // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
              tabIndex={0}
              aria-label={`${words.title}: threads of ${listeners.length} listeners, arrow keys follow one`}
              {...keys}
            >
              <svg
                className="chart-svg threads"
                data-lifted={shown !== null}
                width={width}
                height={layout.height}
                role="img"
                aria-label={`${words.title}. ${words.sentence}`}
              >
                <ThreadsPicture
                  units={units}
                  scale={scale}
                  layout={layout}
                  listeners={listeners.length}
                  width={width}
                  lifted={shown}
                  onLift={setLifted}
                />
              </svg>
            </div>
            <p className="threads-said" role="status">
              {said}
            </p>
          </>
        )
      }}
    </ChartFrame>
  )
}
