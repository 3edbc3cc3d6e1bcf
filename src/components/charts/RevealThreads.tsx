import { useWidth } from '#src/hooks/useWidth.ts'
import { Cloth } from '../Cloth.tsx'
import type { Family } from '../families.ts'
import type { HeardScale } from './geometry/heard-line.ts'
import { layOutThreads } from './geometry/threads.ts'
import type { ThreadUnit } from './geometry/threads.ts'
import { ThreadsPicture } from './ThreadsPicture.tsx'

interface RevealThreadsProps {
  family: Family
  scale: HeardScale
  units: ThreadUnit[]
  /** How many listeners the units' scores hold. */
  listeners: number
  /** How many units are out, from the lowest mean to the highest. */
  revealed: number
  /** What the picture shows so far, in a sentence. */
  sentence: string
  /** A listener's own thread, kept lifted. */
  own?: number
}

/** The reveal: each unit's column under its own cloth, drawn aside one after another from the lowest mean. */
export function RevealThreads({
  family,
  scale,
  units,
  listeners,
  revealed,
  sentence,
  own,
}: RevealThreadsProps) {
  const [ref, width] = useWidth<HTMLDivElement>(960)
  const layout = layOutThreads(units, scale, width)
  const edges = layout.columns.map((x, nth) => {
    const before = layout.columns[nth - 1]
    const after = layout.columns[nth + 1]
    const left = before === undefined ? layout.x0 - 6 : (before + x) / 2
    const right = after === undefined ? width : (x + after) / 2
    return { left, width: right - left }
  })
  return (
    <div ref={ref} className="chart-picture" data-family={family}>
      <svg
        className="chart-svg threads"
        data-lifted={own !== undefined}
        width={width}
        height={layout.height}
        role="img"
        aria-label={sentence}
      >
        <ThreadsPicture
          units={units}
          scale={scale}
          layout={layout}
          listeners={listeners}
          width={width}
          lifted={own ?? null}
          onLift={() => undefined}
          shown={revealed}
        />
      </svg>
      {edges.map((edge, nth) => (
        <div
          key={nth}
          className="clothed reveal-cloth"
          style={{ left: edge.left, width: edge.width, height: layout.height }}
        >
          <Cloth drawn={nth < revealed} />
        </div>
      ))}
    </div>
  )
}
