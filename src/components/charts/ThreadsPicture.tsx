import { threadPath } from './geometry/threads.ts'
import type { ThreadUnit, ThreadsLayout } from './geometry/threads.ts'

interface ThreadsPictureProps {
  units: ThreadUnit[]
  scale: {
    low: number
    high: number
    sided: 'one' | 'two'
    lowWord: string
    midWord?: string
    highWord: string
  }
  layout: ThreadsLayout
  listeners: number
  width: number
  lifted: number | null
  onLift: (listener: number | null) => void
}

/** The drawing of the threads: columns, one thin line per listener, the panel's line bold, names and end words. */
export function ThreadsPicture(props: ThreadsPictureProps) {
  const { units, scale, layout, listeners, width, lifted, onLift } = props
  const { order, columns, y } = layout
  const inOrder = order.flatMap((nth) => units[nth] ?? [])
  const height = (score: number | null | undefined) =>
    score === null || score === undefined ? null : y(score)
  const paths = Array.from({ length: listeners }, (_, listener) =>
    threadPath(
      columns,
      inOrder.map((unit) => height(unit.scores[listener])),
    ),
  )
  const panel = threadPath(
    columns,
    inOrder.map((unit) => y(unit.mean)),
  )
  const middle = y((scale.low + scale.high) / 2)
  const beside = layout.wordsBeside
  return (
    <>
      {columns.map((x) => (
        <line key={x} className="chart-line" x1={x} x2={x} y1={layout.top} y2={layout.bottom} />
      ))}
      {scale.sided === 'two' && (
        <line
          className="chart-middle"
          x1={layout.x0}
          x2={width - (beside ? 20 : 0)}
          y1={middle}
          y2={middle}
        />
      )}
      <text className="chart-word" x={0} y={beside ? layout.top + 5 : 14}>
        {scale.highWord}
      </text>
      {beside && scale.sided === 'two' && scale.midWord && (
        <text className="chart-word" x={0} y={middle + 5}>
          {scale.midWord}
        </text>
      )}
      <text className="chart-word" x={0} y={layout.bottom + (beside ? 5 : 18)}>
        {scale.lowWord}
      </text>
      {paths.map((path, listener) => (
        <path key={listener} className="thread-listener" data-lifted={listener === lifted} d={path} />
      ))}
      <path className="chart-under" strokeWidth={8} d={panel} />
      <path className="chart-family-stroke" strokeWidth={3.5} d={panel} />
      {lifted !== null && <path className="thread-listener" data-lifted="true" d={paths[lifted]} />}
      {inOrder.map((unit, nth) => (
        <circle key={unit.name} className="chart-knot" cx={columns[nth]} cy={y(unit.mean)} r={5} />
      ))}
      {paths.map((path, listener) => (
        <path
          key={listener}
          className="thread-reach"
          d={path}
          onPointerEnter={() => onLift(listener)}
          onPointerLeave={(event) => {
            if (event.pointerType === 'mouse') onLift(null)
          }}
        />
      ))}
      {layout.names.map((name) => (
        <text key={name.nth} className="chart-name-small" x={name.x} y={layout.namesY + name.line * 19}>
          {inOrder[name.nth]?.name}
        </text>
      ))}
    </>
  )
}
