import { useEffect } from 'react'

const forward = new Set(['ArrowRight', 'ArrowDown', 'PageDown', ' ', 'Enter'])
const backward = new Set(['ArrowLeft', 'ArrowUp', 'PageUp', 'Backspace'])

/**
 * Keys (a presenter's clicker sends Page Up and Page Down) and taps anywhere on the page step through the reveal.
 * A press on a button or link stays theirs.
 */
export function useAdvance(next: () => void, back: () => void) {
  useEffect(() => {
    const onVerb = (target: EventTarget | null) =>
      target instanceof Element && target.closest('a, button, input, summary') !== null
    const onKey = (event: KeyboardEvent) => {
      if (event.altKey || event.ctrlKey || event.metaKey) return
      if ((event.key === ' ' || event.key === 'Enter') && onVerb(event.target)) return
      if (forward.has(event.key)) next()
      else if (backward.has(event.key)) back()
      else return
      event.preventDefault()
    }
    const onTap = (event: MouseEvent) => {
      if (!onVerb(event.target)) next()
    }
    document.addEventListener('keydown', onKey)
    document.addEventListener('click', onTap)
    return () => {
      document.removeEventListener('keydown', onKey)
      document.removeEventListener('click', onTap)
    }
  }, [next, back])
}
