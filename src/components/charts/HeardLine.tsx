import type { Family } from '../families.ts'
import { DataTable } from '../ui/DataTable.tsx'
import type { Column } from '../ui/DataTable.tsx'
import { ChartFrame } from './ChartFrame.tsx'
import type { ChartWords } from './ChartFrame.tsx'
import { countWords, layOutHeardLine } from './geometry/heard-line.ts'
import type { HeardRow, HeardScale } from './geometry/heard-line.ts'
import { HeardLineRow } from './HeardLineRow.tsx'
import { printed, printedRange } from './number-words.ts'

interface HeardLineProps extends ChartWords {
  family: Family
  /** The descriptor's own scale with its end words. */
  scale: HeardScale
  /** One per unit, in the order in which they are shown. */
  rows: HeardRow[]
  /** Decimals in the table; 0 for a scale of 100. */
  decimals?: number
}

const columnsFor = (rows: HeardRow[], decimals: number): Column<HeardRow>[] => {
  const columns: Column<HeardRow>[] = [
    { key: 'name', header: 'Unit', cell: (row) => row.name, names: true },
    { key: 'median', header: 'Median', numeric: true, cell: (row) => printed(row.median, decimals) },
    {
      key: 'half',
      header: 'Middle half',
      numeric: true,
      cell: (row) => printedRange(row.q1, row.q3, decimals),
    },
  ]
  if (rows.some((row) => row.adjusted))
    columns.push({
      key: 'adjusted',
      header: 'Adjusted mean, 95 % interval',
      numeric: true,
      cell: (row) =>
        row.adjusted
          ? `${printed(row.adjusted.mean, decimals)}, ${printedRange(row.adjusted.low, row.adjusted.high, decimals)}`
          : '–',
    })
  columns.push(
    { key: 'n', header: 'n', numeric: true, cell: (row) => row.n },
    { key: 'cantTell', header: 'Can’t tell', numeric: true, cell: (row) => row.cantTell },
  )
  return columns
}

/**
 * Heard line: a row per unit on the descriptor's own scale. Raw points as ticks, the middle half as a wash, the median an
 * upright; below them the adjusted mean with its 95 % interval (thin) and its comparison bar (thick: two that do not
 * touch differ); n and "can't tell" at the row's end. The middle of a two-sided scale is dotted and never cut.
 */
export function HeardLine({ family, scale, rows, decimals = 0, ...words }: HeardLineProps) {
  const bars = rows.some((row) => row.comparisonHalf !== undefined)
  return (
    <ChartFrame
      {...words}
      family={family}
      table={
        <DataTable
          caption={words.title}
          captionHidden
          density="close"
          columns={columnsFor(rows, decimals)}
          rows={rows}
          rowKey={(row) => row.name}
        />
      }
      reading={
        <>
          Each tick above a line is one rating; ticks that fall together are stacked. The band on the line is
          the middle half of the ratings, the upright in it their median. The dot below is the mean, adjusted
          for who rated; its thin line is the 95 % interval.{' '}
          {bars && 'Two units whose thick bars do not touch differ.'} The number at the end of a row says how
          many rated it.
        </>
      }
    >
      {(width) => {
        const layout = layOutHeardLine(rows, scale, width)
        const middle = layout.x((scale.low + scale.high) / 2)
        return (
          <svg
            className="chart-svg"
            width={width}
            height={layout.height}
            role="img"
            aria-label={`${words.title}. ${words.sentence}`}
          >
            {layout.words.map((word) => (
              <text
                key={word.text}
                className="chart-word"
                x={word.x}
                y={14 + word.line * 19}
                textAnchor={word.anchor}
              >
                {word.text}
              </text>
            ))}
            {!layout.narrow && (
              <text className="chart-word" x={width} y={14 + (layout.wordLines - 1) * 19} textAnchor="end">
                n
              </text>
            )}
            {scale.sided === 'two' && (
              <line className="chart-middle" x1={middle} x2={middle} y1={layout.top - 4} y2={layout.height} />
            )}
            {rows.map((row, nth) => (
              <HeardLineRow
                key={row.name}
                row={row}
                nth={nth}
                layout={layout}
                width={width}
                count={countWords(row)}
              />
            ))}
          </svg>
        )
      }}
    </ChartFrame>
  )
}
