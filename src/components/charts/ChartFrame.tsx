import { useId } from 'react'
import type { ReactNode } from 'react'
import { useWidth } from '#src/hooks/useWidth.ts'
import type { Family } from '../families.ts'
import { Disclosure } from '../ui/Disclosure.tsx'

export interface ChartWords {
  title: string
  /** One sentence of what the picture shows. */
  sentence: string
  heading?: 'h2' | 'h3'
  /** Leaves title and sentence to the page around it (they stay for a screen reader). */
  bare?: boolean
}

interface ChartFrameProps extends ChartWords {
  family?: Family
  /** The same as a table. */
  table: ReactNode
  /** How to read the picture, in sentences. */
  reading?: ReactNode
  /** Draws the picture at the column's own width in pixels. */
  children: (width: number) => ReactNode
}

/** Frame of a picture: title, one sentence, the picture at its column's own width, its table behind a toggle. */
export function ChartFrame({
  title,
  sentence,
  heading: Heading = 'h3',
  bare,
  family,
  table,
  reading,
  children,
}: ChartFrameProps) {
  const id = useId()
  const [ref, width] = useWidth<HTMLDivElement>()
  return (
    <figure className="chart" data-family={family} aria-labelledby={`${id}-title`}>
      <figcaption className={bare ? 'visually-hidden' : undefined}>
        <Heading id={`${id}-title`} className="chart-title">
          {title}
        </Heading>
        <p className="chart-sentence">{sentence}</p>
      </figcaption>
      <div ref={ref} className="chart-picture">
        {children(width)}
      </div>
      <div className="chart-table">
        <Disclosure summary="The numbers">{table}</Disclosure>
        {reading && (
          <Disclosure summary="How to read this">
            <div className="note measure">{reading}</div>
          </Disclosure>
        )}
      </div>
    </figure>
  )
}
