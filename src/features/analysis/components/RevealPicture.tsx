import type { Reveal } from '#shared/contracts/analysis.ts'
import { Cloth } from '#src/components/Cloth.tsx'
import { asPoints } from '#src/components/results/figures.ts'
import { useWidth } from '#src/hooks/useWidth.ts'
import { threadPath, xOf, yOf } from '../reveal-lines.ts'
import type { Stage } from '../reveal-lines.ts'

interface RevealPictureProps {
  reveal: Reveal
  /** How many units are out from under the cloth. */
  drawn: number
}

type Unit = Reveal['units'][number]

/** One unit's line: name above it, everybody's points, the middle half as a wash, the median's tick and its figure. */
function UnitLine({ unit, row, values, stage }: { unit: Unit; row: number; values: number[]; stage: Stage }) {
  const y = yOf(row, stage)
  return (
    <g>
      <text x={xOf(stage.scale.low, stage)} y={y - 20} className="chart-name chart-over-threads">
        {unit.name}
      </text>
      {unit.median !== null && (
        <text x={stage.width - 14} y={y - 20} textAnchor="end" className="chart-name chart-over-threads">
          {asPoints(unit.median, stage.scale)}
        </text>
      )}
      <line x1={14} x2={stage.width - 14} y1={y} y2={y} className="chart-line" />
      {unit.q1 !== null && unit.q3 !== null && (
        <rect
          x={xOf(unit.q1, stage)}
          width={Math.max(2, xOf(unit.q3, stage) - xOf(unit.q1, stage))}
          y={y - 6}
          height={12}
          className="chart-wash"
        />
      )}
      {values.map((value, nth) => (
        <line
          key={nth}
          x1={xOf(value, stage)}
          x2={xOf(value, stage)}
          y1={y - 7}
          y2={y + 7}
          className="chart-point"
        />
      ))}
    </g>
  )
}

/** The room's picture: a row a unit, a thread a listener running down through them, cloth over what is to come. */
export function RevealPicture({ reveal, drawn }: RevealPictureProps) {
  const [ref, width] = useWidth<HTMLDivElement>(720)
  const { scale, family, words, name } = reveal.descriptor
  const stage: Stage = { width, rowHeight: reveal.units.length > 6 ? 62 : 84, scale }
  const height = reveal.units.length * stage.rowHeight
  const out = reveal.units.slice(0, drawn)
  return (
    <figure data-family={family}>
      <div className="flex justify-between gap-4 text-14 text-muted">
        <span>{words.low}</span>
        <span>{words.high}</span>
      </div>
      <div ref={ref} className="relative mt-2">
        <svg
          className="chart-svg"
          viewBox={`0 0 ${width} ${height}`}
          height={height}
          role="img"
          aria-label={`${name}, ${drawn} of ${reveal.units.length} units: one line a unit, one thread a listener.`}
        >
          {reveal.threads.map((thread, nth) => (
            <path key={nth} d={threadPath(thread.values, drawn, stage)} className="thread-listener" />
          ))}
          <path
            d={threadPath(
              out.map((unit) => unit.median),
              drawn,
              stage,
            )}
            className="chart-family-stroke"
            strokeWidth={3.5}
          />
          {out.map((unit, row) => (
            <UnitLine
              key={row}
              unit={unit}
              row={row}
              stage={stage}
              values={reveal.threads.flatMap((thread) => thread.values[row] ?? [])}
            />
          ))}
          {out.map(
            (unit, row) =>
              unit.median !== null && (
                <circle
                  key={row}
                  cx={xOf(unit.median, stage)}
                  cy={yOf(row, stage)}
                  r={6}
                  className="chart-knot"
                />
              ),
          )}
        </svg>
        {reveal.units.map((_, row) => (
          <div
            key={row}
            className="clothed absolute inset-x-0"
            style={{ position: 'absolute', top: row * stage.rowHeight + 3, height: stage.rowHeight - 6 }}
            data-drawn={row < drawn}
          >
            <Cloth drawn={row < drawn} />
          </div>
        ))}
      </div>
    </figure>
  )
}
