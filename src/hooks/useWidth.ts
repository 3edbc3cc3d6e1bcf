import { useCallback, useState } from 'react'

/**
 * The width of an element in CSS pixels, kept up to date, so that a picture is drawn at its column's own width.
 * @param initial width until the element is measured (and where nothing is laid out)
 * @returns a ref for the element, and its width
 */
export function useWidth<T extends Element>(
  initial = 640,
): [(node: T | null) => void | (() => void), number] {
  const [width, setWidth] = useState(initial)
  const ref = useCallback((node: T | null) => {
    if (!node) return
    const take = (next: number) => {
      if (next > 0) setWidth(Math.floor(next))
    }
    take(node.getBoundingClientRect().width)
    if (typeof ResizeObserver === 'undefined') return
    const observer = new ResizeObserver((entries) => {
      for (const entry of entries) take(entry.contentRect.width)
    })
    observer.observe(node)
    return () => observer.disconnect()
  }, [])
  return [ref, width]
}
