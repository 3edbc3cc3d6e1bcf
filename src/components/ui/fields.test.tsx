import { render, screen } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { useState } from 'react'
import { expect, test, vi } from 'vitest'
import { ChoiceRows } from './ChoiceRows.tsx'
import { ErrorSummary } from './ErrorSummary.tsx'
import { NumberInSentence } from './NumberInSentence.tsx'
import { TextField } from './TextField.tsx'

test('an error stands beside the hint and never takes its place', () => {
  render(<TextField label="Title" name="title" hint="Listeners read it." error="Give the round a title" />)
  const entry = screen.getByRole('textbox', { name: 'Title' })
  expect(entry).toHaveAccessibleDescription('Listeners read it. Give the round a title')
  expect(entry).toBeInvalid()
})

test('a summary of errors takes the focus, each time again, and leads to its fields', async () => {
  const user = userEvent.setup()
  const errors = [
    { field: 'title', message: 'Give the round a title' },
    { field: 'who', message: 'Choose who tags the pouches' },
  ]
  const form = (attempt: number) => (
    <>
      <ErrorSummary errors={errors} attempt={attempt} />
      <TextField label="Title" name="title" />
      <ChoiceRows
        legend="Who tags"
        name="who"
        value={null}
        onChange={() => undefined}
        choices={[{ value: 'keeper', label: 'A keeper' }]}
      />
    </>
  )
  const { rerender } = render(form(1))
  expect(screen.getByRole('alert')).toHaveFocus()
  await user.click(screen.getByRole('link', { name: 'Give the round a title' }))
  expect(screen.getByRole('textbox', { name: 'Title' })).toHaveFocus()
  await user.click(screen.getByRole('link', { name: 'Choose who tags the pouches' }))
  expect(screen.getByRole('radio', { name: 'A keeper' })).toHaveFocus()
  rerender(form(2))
  expect(screen.getByRole('alert')).toHaveFocus()
})

function Sentence({ said }: { said: (value: number) => void }) {
  const [value, setValue] = useState(6)
  return (
    <p>
      <NumberInSentence
        label="Units"
        value={value}
        min={3}
        max={12}
        onChange={(next) => {
          said(next)
          setValue(next)
        }}
      />{' '}
      units
    </p>
  )
}

test('a number in a sentence is taken when it is within its limits, and says them when it is not', async () => {
  const user = userEvent.setup()
  const said = vi.fn()
  render(<Sentence said={said} />)
  const entry = screen.getByRole('textbox', { name: 'Units' })
  await user.clear(entry)
  expect(said).not.toHaveBeenCalled()
  await user.type(entry, '4')
  expect(said).toHaveBeenLastCalledWith(4)
  await user.type(entry, '0')
  expect(said).toHaveBeenCalledTimes(1)
  expect(entry).toBeInvalid()
  expect(entry).toHaveAccessibleDescription('3 to 12')
  await user.tab()
  expect(entry).toHaveValue('4')
  expect(entry).toBeValid()
})

test('a number in a sentence steps with the arrow keys and stops at its limits', async () => {
  const user = userEvent.setup()
  const said = vi.fn()
  render(<Sentence said={said} />)
  await user.click(screen.getByRole('textbox', { name: 'Units' }))
  await user.keyboard('{ArrowDown}{ArrowDown}{ArrowDown}{ArrowDown}')
  expect(said.mock.calls.map(([value]) => value as number)).toEqual([5, 4, 3, 3])
})

test('half of a thing is refused where only whole ones are counted', async () => {
  const user = userEvent.setup()
  const said = vi.fn()
  render(<Sentence said={said} />)
  await user.clear(screen.getByRole('textbox'))
  await user.type(screen.getByRole('textbox'), '4,5')
  expect(said.mock.calls).toEqual([[4]])
})

test('several choices come back in the order in which they stand, not in that of the taps', async () => {
  const user = userEvent.setup()
  const chosen = vi.fn()
  render(
    <ChoiceRows
      type="checkbox"
      legend="Descriptors"
      value={['air']}
      onChange={chosen}
      choices={[
        { value: 'width', label: 'Width' },
        { value: 'warmth', label: 'Warmth', disabledReason: 'Frozen with the plan.' },
        { value: 'air', label: 'Air' },
      ]}
    />,
  )
  await user.click(screen.getByRole('checkbox', { name: 'Width' }))
  expect(chosen).toHaveBeenLastCalledWith(['width', 'air'])
  expect(screen.getByRole('checkbox', { name: 'Warmth' })).toBeDisabled()
  expect(screen.getByRole('checkbox', { name: 'Warmth' })).toHaveAccessibleDescription(
    'Frozen with the plan.',
  )
})
