import { scaleLinear } from 'd3-scale'
import { useWidth } from '#src/hooks/useWidth.ts'
import type { Family } from '../families.ts'
import { labelWhatFits, staggerLabels, type PlacedLabel } from './geometry/labels.ts'
import { textWidth } from './geometry/text-width.ts'
import { printed } from './number-words.ts'

interface HeardLineMiniProps {
  family: Family
  scale: { low: number; high: number; lowWord: string; highWord: string }
  /** Each unit's mean (adjusted where there is one). */
  points: { name: string; value: number }[]
}

const lineHeight = 16
const mostLines = 3

/** All names on up to three lines over their knots; only where even those do not do, as many as stand apart. */
function placeNames(points: { name: string; value: number }[], xs: number[], x0: number, x1: number) {
  const names = points.map((point) => point.name)
  const { labels, lines } = staggerLabels(names, xs, x0, x1, 13)
  return lines > 0 && lines <= mostLines
    ? { labels, lines }
    : { labels: labelWhatFits(names, xs, x0, x1, 13), lines: 1 }
}

/**
 * A heard line for a list of verdicts, 24 px high where its names stand side by side: the units as knots on one thread,
 * its end words beside it or, where there is no room, below.
 */
export function HeardLineMini({ family, scale, points }: HeardLineMiniProps) {
  const [ref, width] = useWidth<HTMLDivElement>(480)
  const low = textWidth(scale.lowWord, 13)
  const high = textWidth(scale.highWord, 13)
  const beside = low + high < width * 0.42
  const left = beside ? low + 12 : 5
  const right = beside ? width - high - 12 : width - 5
  const ordered = [...points].sort((a, b) => a.value - b.value)
  const covers = ({ nth, x: from }: PlacedLabel, at: number): boolean =>
    at > from - 2 && at < from + textWidth(ordered[nth]?.name ?? '', 13) + 2
  const x = scaleLinear([scale.low, scale.high], [left, right]).clamp(true)
  const { labels, lines } = placeNames(
    ordered,
    ordered.map((point) => x(point.value)),
    beside ? left : 0,
    beside ? right : width,
  )
  // A name on an upper line is tied to its knot, unless the tie would cross another name.
  const leaders = labels
    .map((label) => ({ ...label, at: x(ordered[label.nth]?.value ?? 0) }))
    .filter(({ line, at }) => line > 0 && !labels.some((other) => other.line < line && covers(other, at)))
  const y = 2 + lines * lineHeight
  const wordsAt = beside ? y + 4 : y + 20
  const said = [...points]
    .sort((a, b) => b.value - a.value)
    .map((point) => `${point.name} ${printed(point.value)}`)
    .join(', ')
  return (
    <div ref={ref} data-family={family}>
      <svg
        className="chart-svg"
        width={width}
        height={beside ? y + 6 : y + 24}
        role="img"
        aria-label={`From ${scale.lowWord} to ${scale.highWord}: ${said}`}
        style={{ fontSize: 13 }}
      >
        <text className="chart-word" x={0} y={wordsAt}>
          {scale.lowWord}
        </text>
        <text className="chart-word" x={width} y={wordsAt} textAnchor="end">
          {scale.highWord}
        </text>
        <line className="chart-line" x1={left} x2={right} y1={y} y2={y} />
        {leaders.map(({ nth, at, line }) => (
          <line key={nth} className="chart-line" x1={at} x2={at} y1={y - line * lineHeight - 5} y2={y} />
        ))}
        {ordered.map((point) => (
          <circle key={point.name} className="chart-family-fill" cx={x(point.value)} cy={y} r={4} />
        ))}
        {labels.map((label) => (
          <text key={label.nth} className="chart-name-small" x={label.x} y={y - 8 - label.line * lineHeight}>
            {ordered[label.nth]?.name}
          </text>
        ))}
      </svg>
    </div>
  )
}
