import { useRef, useState } from 'react'
import type { PointerEvent } from 'react'
import { shareOf, valueAt } from './answer.ts'
import type { Answer, LineScale } from './answer.ts'

/** Pixels a finger may wander before a touch is taken for a drag or a scroll. */
const SLOP = 8
const THUMB_RADIUS = 22

interface Gesture {
  id: number
  startX: number
  startY: number
  /** Distance from the finger to the thumb's centre when the thumb itself was taken. */
  grab: number
  intent: 'none' | 'sideways' | 'elsewhere'
}

/**
 * Pointer behaviour of a rating line: a tap or a sideways drag sets it, a vertical scroll over it never does. The tap is
 * taken from the click, which a browser withholds when the touch only stopped a fling; with touch-action pan-y a scroll
 * ends in pointercancel and no click.
 */
export function useLinePointer(scale: LineScale, answer: Answer, set: (value: number) => void) {
  const gesture = useRef<Gesture | null>(null)
  const swallowClick = useRef(false)
  const [dragging, setDragging] = useState(false)

  const at = (line: Element, clientX: number) => {
    const box = line.getBoundingClientRect()
    return valueAt(scale, box.width > 0 ? (clientX - box.left) / box.width : 0)
  }
  const end = () => {
    gesture.current = null
    setDragging(false)
  }

  const handlers = {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      swallowClick.current = false
      if (event.button !== 0 || gesture.current) return
      // A finger is captured by the browser itself; a mouse may leave the line before its drag is known as one.
      if (event.pointerType === 'mouse') event.currentTarget.setPointerCapture?.(event.pointerId)
      const box = event.currentTarget.getBoundingClientRect()
      const thumb =
        typeof answer === 'number' ? box.left + shareOf(scale, answer) * box.width - event.clientX : Infinity
      gesture.current = {
        id: event.pointerId,
        startX: event.clientX,
        startY: event.clientY,
        grab: Math.abs(thumb) <= THUMB_RADIUS ? thumb : 0,
        intent: 'none',
      }
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      const held = gesture.current
      if (!held || held.id !== event.pointerId || held.intent === 'elsewhere') return
      const across = Math.abs(event.clientX - held.startX)
      const down = Math.abs(event.clientY - held.startY)
      if (held.intent === 'none') {
        if (Math.max(across, down) < SLOP) return
        held.intent = across > down ? 'sideways' : 'elsewhere'
        if (held.intent === 'elsewhere') return
        event.currentTarget.setPointerCapture?.(event.pointerId)
        setDragging(true)
      }
      set(at(event.currentTarget, event.clientX + held.grab))
    },
    onPointerUp(event: PointerEvent<HTMLElement>) {
      const held = gesture.current
      if (!held || held.id !== event.pointerId) return
      swallowClick.current = held.intent !== 'none'
      end()
    },
    onPointerCancel() {
      swallowClick.current = true
      end()
    },
    onClick(event: React.MouseEvent<HTMLElement>) {
      if (swallowClick.current) {
        swallowClick.current = false
        return
      }
      set(at(event.currentTarget, event.clientX))
    },
  }
  return { handlers, dragging }
}
