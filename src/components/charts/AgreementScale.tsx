import { scaleLinear } from 'd3-scale'
import { useWidth } from '#src/hooks/useWidth.ts'
import type { Family } from '../families.ts'
import { printed } from './number-words.ts'

interface AgreementScaleProps {
  /** Agreement from 0 (chance) to 1 (as one); what lies below 0 is drawn at chance. */
  estimate: number
  low: number
  high: number
  family?: Family
  /** Says "chance" and "as one" under the ends; once in a list is enough. */
  ends?: boolean
  /** What agrees: "Width". For a screen reader. */
  label: string
}

/** Limits of the words hardly, a little, fairly, well, as one. */
const BANDS = [0.25, 0.5, 0.75, 0.9]

/** A number line from "chance" to "as one" with estimate and interval. */
export function AgreementScale({ estimate, low, high, family, ends = true, label }: AgreementScaleProps) {
  const [ref, width] = useWidth<HTMLDivElement>(240)
  const x = scaleLinear([0, 1], [7, width - 7]).clamp(true)
  const y = 12
  return (
    <div ref={ref} className="agreement-scale" data-family={family}>
      <svg
        className="chart-svg"
        width={width}
        height={ends ? 42 : 24}
        role="img"
        aria-label={`${label}: agreement ${printed(estimate, 2)}, between ${printed(low, 2)} and ${printed(high, 2)}, on a line from chance at 0 to as one at 1`}
        style={{ fontSize: 13 }}
      >
        <line className="chart-ink-stroke" x1={x(0)} x2={x(1)} y1={y} y2={y} />
        {[0, 1].map((end) => (
          <line key={end} className="chart-ink-stroke" x1={x(end)} x2={x(end)} y1={y - 6} y2={y + 6} />
        ))}
        {BANDS.map((band) => (
          <line key={band} className="chart-ink-stroke" x1={x(band)} x2={x(band)} y1={y - 3} y2={y + 3} />
        ))}
        <rect className="chart-bar" x={x(low)} y={y - 4} width={Math.max(2, x(high) - x(low))} height={8} />
        <circle className="chart-family-fill" cx={x(estimate)} cy={y} r={5} />
        {ends && (
          <>
            <text className="chart-word" x={1} y={36}>
              chance
            </text>
            <text className="chart-word" x={width - 1} y={36} textAnchor="end">
              as one
            </text>
          </>
        )}
      </svg>
    </div>
  )
}

/** The ends, said once over a column of scales whose own ends are off. */
export function AgreementEnds() {
  return (
    <span className="flex justify-between gap-4 text-13">
      <span>chance</span>
      <span>as one</span>
    </span>
  )
}
