/** Warp and weft of the mark: three threads by three, each under where the other is over. Units of a 26 square. */
const THREADS: [number, number, number, number][] = [
  [2, 6, 10.6, 6],
  [15.4, 6, 24, 6],
  [2, 13, 4.2, 13],
  [8.8, 13, 17.2, 13],
  [21.8, 13, 24, 13],
  [2, 20, 10.6, 20],
  [15.4, 20, 24, 20],
  [6.5, 2, 6.5, 3.6],
  [6.5, 8.4, 6.5, 17.6],
  [6.5, 22.4, 6.5, 24],
  [13, 2, 13, 10.6],
  [13, 15.4, 13, 24],
  [19.5, 2, 19.5, 3.6],
  [19.5, 8.4, 19.5, 17.6],
  [19.5, 22.4, 19.5, 24],
]

/** The mark: a plain weave of three by three. `size` in pixels; decorative unless the name does not stand beside it. */
export function Mark({ size = 26, label }: { size?: number; label?: string }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 26 26"
      role={label ? 'img' : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      {THREADS.map(([x1, y1, x2, y2]) => (
        <line
          key={`${x1} ${y1} ${x2}`}
          x1={x1}
          y1={y1}
          x2={x2}
          y2={y2}
          stroke="currentColor"
          strokeWidth="2.6"
        />
      ))}
    </svg>
  )
}
