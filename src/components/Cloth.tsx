import { useId } from 'react'
import { useWidth } from '#src/hooks/useWidth.ts'

interface ClothProps {
  /** True draws the cloth aside: twelve threads leave one after another, 40 ms apart, 700 ms in all. */
  drawn?: boolean
  /** Size of the weave's tile in pixels. */
  tile?: 6 | 8
}

const STRIPS = 12

/** One tile of the weave, 8 by 8: warp and weft, over and under. */
function Weave({ id, tile }: { id: string; tile: number }) {
  return (
    <pattern
      id={id}
      width="8"
      height="8"
      patternUnits="userSpaceOnUse"
      patternTransform={`scale(${tile / 8}) rotate(45)`}
    >
      <rect className="cloth-ground" width="8" height="8" />
      <g className="cloth-weft">
        <rect x="0" y="0" width="4" height="1.6" />
        <rect x="0" y="2.4" width="4" height="1.6" />
        <rect x="4" y="4" width="4" height="1.6" />
        <rect x="4" y="6.4" width="4" height="1.6" />
      </g>
      <g className="cloth-warp">
        <rect x="4.4" y="0" width="1.2" height="4" />
        <rect x="6.4" y="0" width="1.2" height="4" />
        <rect x="0.4" y="4" width="1.2" height="4" />
        <rect x="2.4" y="4" width="1.2" height="4" />
      </g>
    </pattern>
  )
}

/**
 * Cloth over what is masked, and nothing else. Fills its nearest positioned ancestor (class `clothed`) and hides
 * nothing from a screen reader: what must not be known must not be in the page. Decorative.
 */
export function Cloth({ drawn = false, tile = 8 }: ClothProps) {
  const id = useId()
  const [ref, width] = useWidth<SVGSVGElement>(480)
  const strip = width / STRIPS
  return (
    <svg ref={ref} className="cloth" data-drawn={drawn} aria-hidden="true">
      <defs>
        <Weave id={id} tile={tile} />
      </defs>
      {Array.from({ length: STRIPS }, (_, nth) => (
        <rect
          key={nth}
          className="cloth-strip"
          style={{ '--nth': nth, '--away': Math.ceil((nth + 1) * strip) + 1 } as React.CSSProperties}
          x={nth * strip}
          y="0"
          width={strip + 0.5}
          height="100%"
          fill={`url(#${id})`}
        />
      ))}
    </svg>
  )
}
