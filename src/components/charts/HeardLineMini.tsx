import { scaleLinear } from 'd3-scale'
import { useWidth } from '#src/hooks/useWidth.ts'
import type { Family } from '../families.ts'
import { labelWhatFits } from './geometry/labels.ts'
import { textWidth } from './geometry/text-width.ts'
import { printed } from './number-words.ts'

interface HeardLineMiniProps {
  family: Family
  scale: { low: number; high: number; lowWord: string; highWord: string }
  /** Each unit's mean (adjusted where there is one). */
  points: { name: string; value: number }[]
}

/**
 * A heard line 24 px high, for a list of verdicts: the units as knots on one thread with its end words beside it where
 * there is room, and as many names as stand apart.
 */
export function HeardLineMini({ family, scale, points }: HeardLineMiniProps) {
  const [ref, width] = useWidth<HTMLDivElement>(480)
  const low = textWidth(scale.lowWord, 13)
  const high = textWidth(scale.highWord, 13)
  const beside = low + high < width * 0.42
  const left = beside ? low + 12 : 5
  const right = beside ? width - high - 12 : width - 5
  const x = scaleLinear([scale.low, scale.high], [left, right]).clamp(true)
  const labels = labelWhatFits(
    points.map((point) => point.name),
    points.map((point) => x(point.value)),
    beside ? left : 0,
    beside ? right : width,
    13,
  )
  const said = [...points]
    .sort((a, b) => b.value - a.value)
    .map((point) => `${point.name} ${printed(point.value)}`)
    .join(', ')
  return (
    <div ref={ref} data-family={family}>
      <svg
        className="chart-svg"
        width={width}
        height={24}
        role="img"
        aria-label={`From ${scale.lowWord} to ${scale.highWord}: ${said}`}
        style={{ fontSize: 13 }}
      >
        {beside && (
          <>
            <text className="chart-word" x={0} y={22}>
              {scale.lowWord}
            </text>
            <text className="chart-word" x={width} y={22} textAnchor="end">
              {scale.highWord}
            </text>
          </>
        )}
        <line className="chart-line" x1={left} x2={right} y1={18} y2={18} />
        {points.map((point) => (
          <circle key={point.name} className="chart-family-fill" cx={x(point.value)} cy={18} r={4} />
        ))}
        {labels.map((label) => (
          <text key={label.nth} className="chart-name-small" x={label.x} y={10}>
            {points[label.nth]?.name}
          </text>
        ))}
      </svg>
    </div>
  )
}
