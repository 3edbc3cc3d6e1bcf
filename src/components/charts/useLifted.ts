import { useState } from 'react'
import type { KeyboardEvent } from 'react'

/**
 * Which of `count` threads is lifted: by pointing, or from the keyboard with one stop in the tab order (arrows walk
 * through the threads, Escape lets go).
 */
export function useLifted(count: number) {
  const [lifted, setLifted] = useState<number | null>(null)
  const onKeyDown = (event: KeyboardEvent) => {
    const by = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 }[event.key]
    if (event.key === 'Escape') setLifted(null)
    else if (event.key === 'Home') setLifted(0)
    else if (event.key === 'End') setLifted(count - 1)
    else if (by !== undefined)
      setLifted((now) => (now === null ? (by > 0 ? 0 : count - 1) : (now + by + count) % count))
    else return
    event.preventDefault()
  }
  return {
    lifted: lifted !== null && lifted < count ? lifted : null,
    setLifted,
    keys: { onKeyDown, onBlur: () => setLifted(null) },
  }
}
