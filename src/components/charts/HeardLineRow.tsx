import { TICK, TICK_STEP } from './geometry/heard-line.ts'
import type { HeardLayout, HeardRow } from './geometry/heard-line.ts'

interface HeardLineRowProps {
  row: HeardRow
  nth: number
  layout: HeardLayout
  width: number
  count: string
}

/** One unit's row of a heard line. */
export function HeardLineRow({ row, nth, layout, width, count }: HeardLineRowProps) {
  const place = layout.rows[nth]
  if (!place) return null
  const { x, left, right, narrow } = layout
  const { y, nameY, points } = place
  const { adjusted, comparisonHalf } = row
  const mean = y + 14
  return (
    <g>
      <text className="chart-name" x={0} y={nameY}>
        {row.name}
      </text>
      <text className="chart-count" x={width} y={nameY} textAnchor="end">
        {narrow ? `n ${count}` : count}
      </text>
      <line className="chart-line" x1={left} x2={right} y1={y} y2={y} />
      {row.n > 0 && (
        <>
          <rect
            className="chart-wash"
            x={x(row.q1)}
            y={y - 5}
            width={Math.max(1, x(row.q3) - x(row.q1))}
            height={10}
          />
          {points.map((point, at) => {
            const foot = y - 7 - point.level * TICK_STEP
            return (
              <line key={at} className="chart-point" x1={point.x} x2={point.x} y1={foot} y2={foot - TICK} />
            )
          })}
          <line
            className="chart-family-stroke"
            strokeWidth={3}
            x1={x(row.median)}
            x2={x(row.median)}
            y1={y - 6}
            y2={y + 6}
          />
        </>
      )}
      {adjusted && (
        <>
          {comparisonHalf !== undefined && (
            <rect
              className="chart-bar"
              x={x(adjusted.mean - comparisonHalf)}
              y={mean - 4}
              width={x(adjusted.mean + comparisonHalf) - x(adjusted.mean - comparisonHalf)}
              height={8}
            />
          )}
          <line
            className="chart-family-stroke"
            strokeWidth={1.5}
            x1={x(adjusted.low)}
            x2={x(adjusted.high)}
            y1={mean}
            y2={mean}
          />
          <circle className="chart-family-fill" cx={x(adjusted.mean)} cy={mean} r={4.5} />
        </>
      )}
    </g>
  )
}
