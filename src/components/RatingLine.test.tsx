import { fireEvent, render, screen } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { useState } from 'react'
import { beforeEach, describe, expect, test, vi } from 'vitest'
import type { Answer, LineScale } from './rating/answer.ts'
import { RatingLine } from './RatingLine.tsx'

const warmth: LineScale = {
  low: 0,
  high: 100,
  step: 1,
  sided: 'two',
  lowWord: 'cool, thin',
  midWord: 'neutral',
  highWord: 'warm, thick',
}

const answers = vi.fn<(answer: Answer) => void>()

function Line({ start = null, readOnly = false }: { start?: Answer; readOnly?: boolean }) {
  const [value, setValue] = useState<Answer>(start)
  return (
    <RatingLine
      name="Warmth"
      sentence="Fullness of low voices and cello"
      family="tonal-balance"
      scale={warmth}
      value={value}
      readOnly={readOnly}
      onChange={(next) => {
        answers(next)
        setValue(next)
      }}
    />
  )
}

/** The line lies from x 100 to x 300, so that a pixel is half a point. */
function line() {
  const track = screen.getByTestId('rating-track')
  track.getBoundingClientRect = () => new DOMRect(100, 40, 200, 56)
  return track
}

const finger = (x: number, y = 60) => ({
  pointerId: 7,
  pointerType: 'touch',
  button: 0,
  clientX: x,
  clientY: y,
})
const slider = () => screen.getByRole('slider', { name: 'Warmth' })

beforeEach(() => answers.mockClear())

describe('an untouched line', () => {
  test('is unanswered, says so, and asks to be touched', () => {
    render(<Line />)
    expect(slider()).toHaveAttribute('aria-valuetext', 'not answered')
    expect(screen.getByText('touch the line to answer')).toBeVisible()
    expect(screen.queryByRole('button', { name: /clear/ })).not.toBeInTheDocument()
    expect(answers).not.toHaveBeenCalled()
  })

  test('shows no number before or after an answer', async () => {
    const { container } = render(<Line />)
    fireEvent.click(line(), { clientX: 226 })
    expect(container.textContent).not.toMatch(/\d/)
  })

  test.each(['{ArrowRight}', '{ArrowLeft}', '{PageUp}', '{End}', '{Home}'])(
    'takes the middle at the first key, also at %s',
    async (key) => {
      const user = userEvent.setup()
      render(<Line />)
      await user.tab()
      await user.tab()
      expect(slider()).toHaveFocus()
      await user.keyboard(key)
      expect(answers).toHaveBeenLastCalledWith(50)
      expect(slider()).toHaveAttribute('aria-valuetext', '50 of 100, neutral')
    },
  )

  test('takes the middle at the first step of − or +', async () => {
    const user = userEvent.setup()
    render(<Line />)
    await user.click(screen.getByRole('button', { name: 'Warmth: a step towards cool, thin' }))
    expect(answers).toHaveBeenLastCalledWith(50)
    await user.click(screen.getByRole('button', { name: 'Warmth: a step towards cool, thin' }))
    expect(answers).toHaveBeenLastCalledWith(49)
    expect(screen.getByRole('status')).toHaveTextContent('49 of 100, towards cool, thin')
  })

  test('takes the middle when assistive technology moves the range without a key', () => {
    render(<Line />)
    fireEvent.change(slider(), { target: { value: '51' } })
    expect(answers).toHaveBeenLastCalledWith(50)
  })
})

describe('fingers', () => {
  test('a tap sets the line where it was touched', () => {
    render(<Line />)
    const track = line()
    fireEvent.pointerDown(track, finger(226))
    expect(answers).not.toHaveBeenCalled()
    fireEvent.pointerUp(track, finger(226))
    fireEvent.click(track, { clientX: 226 })
    expect(answers).toHaveBeenLastCalledWith(63)
    expect(slider()).toHaveAttribute('aria-valuetext', '63 of 100, towards warm, thick')
  })

  test('a sideways drag sets it and follows the finger', () => {
    render(<Line />)
    const track = line()
    fireEvent.pointerDown(track, finger(200))
    fireEvent.pointerMove(track, finger(204))
    expect(answers).not.toHaveBeenCalled()
    fireEvent.pointerMove(track, finger(220))
    expect(answers).toHaveBeenLastCalledWith(60)
    fireEvent.pointerMove(track, finger(420))
    expect(answers).toHaveBeenLastCalledWith(100)
    fireEvent.pointerUp(track, finger(420))
  })

  test('a vertical scroll over it never sets it, however far it wanders sideways later', () => {
    render(<Line />)
    const track = line()
    fireEvent.pointerDown(track, finger(200, 60))
    fireEvent.pointerMove(track, finger(203, 90))
    fireEvent.pointerMove(track, finger(290, 120))
    fireEvent.pointerUp(track, finger(290, 120))
    fireEvent.click(track, { clientX: 290 })
    expect(answers).not.toHaveBeenCalled()
    expect(slider()).toHaveAttribute('aria-valuetext', 'not answered')
  })

  test('a touch that the browser takes for scrolling sets nothing', () => {
    render(<Line start={30} />)
    const track = line()
    fireEvent.pointerDown(track, finger(250))
    fireEvent.pointerCancel(track, finger(250, 75))
    expect(answers).not.toHaveBeenCalled()
  })

  test('taking the thumb off its centre does not make it jump', () => {
    render(<Line start={50} />)
    const track = line()
    fireEvent.pointerDown(track, finger(210))
    fireEvent.pointerMove(track, finger(230))
    expect(answers).toHaveBeenLastCalledWith(60)
  })

  test('a second finger is not listened to', () => {
    render(<Line />)
    const track = line()
    fireEvent.pointerDown(track, finger(200))
    fireEvent.pointerDown(track, { ...finger(280), pointerId: 8 })
    fireEvent.pointerMove(track, { ...finger(120), pointerId: 8 })
    expect(answers).not.toHaveBeenCalled()
  })
})

describe('an answered line', () => {
  test('moves by one with the arrows, by ten with the page keys, to the ends with Home and End', async () => {
    const user = userEvent.setup()
    render(<Line start={63} />)
    slider().focus()
    await user.keyboard('{ArrowRight}')
    expect(answers).toHaveBeenLastCalledWith(64)
    await user.keyboard('{PageDown}')
    expect(answers).toHaveBeenLastCalledWith(54)
    await user.keyboard('{End}')
    expect(answers).toHaveBeenLastCalledWith(100)
    await user.keyboard('{Home}')
    expect(answers).toHaveBeenLastCalledWith(0)
  })

  test('is unanswered again after "clear", and the focus is kept', async () => {
    const user = userEvent.setup()
    render(<Line start={63} />)
    await user.click(screen.getByRole('button', { name: 'clear Warmth' }))
    expect(answers).toHaveBeenLastCalledWith(null)
    expect(slider()).toHaveAttribute('aria-valuetext', 'not answered')
    expect(slider()).toHaveFocus()
  })

  test('is unanswered again after Delete', async () => {
    const user = userEvent.setup()
    render(<Line start={63} />)
    slider().focus()
    await user.keyboard('{Delete}')
    expect(answers).toHaveBeenLastCalledWith(null)
  })

  test('leaves the keys alone that are not for it', async () => {
    const user = userEvent.setup()
    render(<Line start={63} />)
    slider().focus()
    await user.keyboard('a{Enter}')
    expect(answers).not.toHaveBeenCalled()
  })

  test('takes nothing once it is locked', () => {
    render(<Line start={63} readOnly />)
    fireEvent.click(line(), { clientX: 120 })
    expect(answers).not.toHaveBeenCalled()
    expect(slider()).toBeDisabled()
    expect(screen.getByRole('checkbox')).toBeDisabled()
  })
})

describe('"I can’t tell"', () => {
  test('is an answer, and taking it back leaves the line unanswered', async () => {
    const user = userEvent.setup()
    render(<Line start={63} />)
    await user.click(screen.getByRole('checkbox', { name: 'I can’t tell' }))
    expect(answers).toHaveBeenLastCalledWith('cant-tell')
    expect(slider()).toHaveAttribute('aria-valuetext', 'answered: I can’t tell')
    await user.click(screen.getByRole('checkbox'))
    expect(answers).toHaveBeenLastCalledWith(null)
  })

  test('gives way to a rating when the line is touched', () => {
    render(<Line start="cant-tell" />)
    fireEvent.click(line(), { clientX: 140 })
    expect(answers).toHaveBeenLastCalledWith(20)
    expect(screen.getByRole('checkbox')).not.toBeChecked()
  })
})

test('a screen reader hears what the line means, its ends and what is missing', () => {
  render(
    <RatingLine
      name="Warmth"
      sentence="Fullness of low voices and cello"
      family="tonal-balance"
      scale={warmth}
      value={null}
      onChange={answers}
      error="Answer this line, or say that you can’t tell."
    />,
  )
  expect(slider()).toHaveAccessibleDescription(
    'Fullness of low voices and cello From cool, thin to warm, thick Answer this line, or say that you can’t tell.',
  )
  expect(slider()).toBeInvalid()
})
