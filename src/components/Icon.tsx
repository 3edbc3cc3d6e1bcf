import { iconPaths } from './icon-paths.ts'
import type { IconName } from './icon-paths.ts'

/**
 * One of the house's signs, 20 px at the reader's own text size. Decorative: a word stands beside it, but for − + and
 * close, whose buttons carry the word as their label.
 */
export function Icon({ name, size = 20 }: { name: IconName; size?: number }) {
  const side = `${size / 16}rem`
  return (
    <svg
      style={{ width: side, height: side, flex: 'none' }}
      viewBox="0 0 20 20"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      strokeLinejoin="round"
      strokeLinecap="square"
      aria-hidden="true"
    >
      <path d={iconPaths[name]} />
    </svg>
  )
}
