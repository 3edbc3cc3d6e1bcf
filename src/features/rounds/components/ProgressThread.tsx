interface ProgressThreadProps {
  done: number
  total: number
  /** What the picture says, in words. */
  words: string
}

/** How many servings are in, as one thread that fills; it counts, and shows nothing of what was rated. */
export function ProgressThread({ done, total, words }: ProgressThreadProps) {
  const share = total > 0 ? Math.min(1, done / total) : 0
  return (
    <div role="img" aria-label={words} className="relative my-4 h-[3px]">
      <span className="absolute inset-x-0 top-px border-t border-dashed border-edge" />
      <span className="absolute inset-y-0 left-0 bg-ink" style={{ width: `${share * 100}%` }} />
    </div>
  )
}
