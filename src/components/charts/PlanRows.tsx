import { useState } from 'react'
import { DataTable } from '../ui/DataTable.tsx'
import { ChartFrame } from './ChartFrame.tsx'
import type { ChartWords } from './ChartFrame.tsx'
import { CELL_HEIGHT, layOutPlan, threadStretches } from './geometry/plan-rows.ts'
import type { PlanRow } from './geometry/plan-rows.ts'

interface PlanRowsProps extends ChartWords {
  /** One per listener, in the order of the seats. */
  rows: PlanRow[]
  turns: number
}

/**
 * Rows of the plan: servings as cells, one thread per listener, columns are turns, rests are gaps where the thread is
 * dotted, repeats are knotted. Pointing at a cell shows where else the same unit is heard.
 */
export function PlanRows({ rows, turns, ...words }: PlanRowsProps) {
  const [same, setSame] = useState<string | null>(null)
  const labelled = rows.some((row) => row.places.some((place) => place.label))
  const heard = rows.flatMap((row) => {
    const at = row.places.filter((place) => place.label === same).map((place) => place.turn)
    return at.length > 0 ? `${row.name} in turn ${at.join(' and ')}` : []
  })
  const said = (row: PlanRow, turn: number) => {
    const place = row.places.find((entry) => entry.turn === turn)
    if (!place) return 'rest'
    return `${place.label ?? 'a serving'}${place.repeat ? ' (again)' : ''}`
  }
  return (
    <ChartFrame
      {...words}
      table={
        <DataTable
          caption={words.title}
          captionHidden
          density="close"
          stays
          rows={rows}
          rowKey={(row) => row.name}
          columns={[
            { key: 'listener', header: 'Listener', cell: (row) => row.name },
            ...Array.from({ length: turns }, (_, nth) => ({
              key: `turn ${nth + 1}`,
              header: `Turn ${nth + 1}`,
              cell: (row: PlanRow) => said(row, nth + 1),
            })),
          ]}
        />
      }
    >
      {(width) => {
        const layout = layOutPlan(rows, turns, width)
        const x = (turn: number) => layout.turnX[turn - 1] ?? 0
        return (
          <>
            <svg
              className="chart-svg"
              width={width}
              height={layout.height}
              role="img"
              aria-label={`${words.title}. ${words.sentence}`}
              onPointerLeave={(event) => {
                if (event.pointerType === 'mouse') setSame(null)
              }}
            >
              {!layout.narrow && (
                <text className="chart-word" x={0} y={14}>
                  turn
                </text>
              )}
              {layout.turnX.map((at, nth) => (
                <text key={at} className="chart-word" x={at} y={14} textAnchor="middle">
                  {layout.narrow && nth === 0 ? `turn ${nth + 1}` : nth + 1}
                </text>
              ))}
              {rows.map((row, nth) => {
                const y = layout.rowY[nth] ?? 0
                return (
                  <g key={row.name}>
                    <text className="chart-name" x={0} y={layout.nameY[nth]}>
                      {row.name}
                    </text>
                    {threadStretches(row.places).map((stretch) => (
                      <line
                        key={stretch.from}
                        className={stretch.rest ? 'plan-rest' : 'plan-thread'}
                        x1={x(stretch.from)}
                        x2={x(stretch.to)}
                        y1={y}
                        y2={y}
                      />
                    ))}
                    {row.places.map((place) => (
                      <g
                        key={place.turn}
                        className="plan-place"
                        data-same={same !== null && place.label === same}
                        data-dimmed={same !== null && place.label !== same}
                        onPointerEnter={() => setSame(place.label ?? null)}
                      >
                        <rect
                          className="plan-cell"
                          x={x(place.turn) - layout.cellWidth / 2}
                          y={y - CELL_HEIGHT / 2}
                          width={layout.cellWidth}
                          height={CELL_HEIGHT}
                          rx={2}
                        />
                        {place.repeat && (
                          <circle
                            className="plan-knot"
                            cx={x(place.turn) + layout.cellWidth / 2}
                            cy={y}
                            r={4}
                          />
                        )}
                        {place.label && (
                          <text className="chart-name-small" x={x(place.turn)} y={y + 5} textAnchor="middle">
                            {layout.words.get(place.label) ?? place.label}
                          </text>
                        )}
                      </g>
                    ))}
                  </g>
                )
              })}
            </svg>
            {labelled && (
              <p className="threads-said" role="status">
                {same === null
                  ? 'Point at a serving, or touch it, to follow its unit.'
                  : `${same}: ${heard.join(', ')}`}
              </p>
            )}
          </>
        )
      }}
    </ChartFrame>
  )
}
