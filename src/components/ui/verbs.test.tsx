import { act, render, screen } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { useState } from 'react'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { Button } from './Button.tsx'
import { CopyLine } from './CopyLine.tsx'
import { ConfirmDialog } from './Dialog.tsx'
import { Waiting } from './Waiting.tsx'

describe('a verb', () => {
  test('that is off says why, can be reached, and does nothing', async () => {
    const user = userEvent.setup()
    const press = vi.fn()
    render(
      <Button onClick={press} disabledReason="Two listeners have no seat yet.">
        Open the round
      </Button>,
    )
    const button = screen.getByRole('button', { name: 'Open the round' })
    expect(button).toHaveAccessibleDescription('Two listeners have no seat yet.')
    await user.tab()
    expect(button).toHaveFocus()
    await user.keyboard('{Enter}')
    expect(press).not.toHaveBeenCalled()
  })

  test('in progress says so and cannot be pressed twice', async () => {
    const user = userEvent.setup()
    const press = vi.fn()
    render(
      <Button onClick={press} busy busyLabel="Opening the round">
        Open the round
      </Button>,
    )
    await user.click(screen.getByRole('button', { name: 'Opening the round' }))
    expect(press).not.toHaveBeenCalled()
  })

  test('in progress does not send its form again', async () => {
    const user = userEvent.setup()
    const send = vi.fn((event: React.FormEvent) => event.preventDefault())
    render(
      <form onSubmit={send}>
        <Button type="submit" busy busyLabel="Sending">
          Send
        </Button>
      </form>,
    )
    await user.click(screen.getByRole('button', { name: 'Sending' }))
    expect(send).not.toHaveBeenCalled()
  })
})

describe('a question on top of the page', () => {
  function Closing({ busy = false, onConfirm = () => undefined }) {
    const [open, setOpen] = useState(false)
    return (
      <>
        <Button onClick={() => setOpen(true)}>Close the round</Button>
        <ConfirmDialog
          open={open}
          onOpenChange={setOpen}
          title="Close the round?"
          consequence="Two servings are still out. This cannot be undone."
          confirmLabel="Close it now"
          busyLabel="Closing"
          busy={busy}
          onConfirm={onConfirm}
        />
      </>
    )
  }

  test('is heard first, acts once asked, and gives the focus back when left', async () => {
    const user = userEvent.setup()
    const confirm = vi.fn()
    render(<Closing onConfirm={confirm} />)
    await user.click(screen.getByRole('button', { name: 'Close the round' }))
    const dialog = screen.getByRole('dialog', { name: 'Close the round?' })
    expect(dialog).toHaveFocus()
    expect(dialog).toHaveAccessibleDescription('Two servings are still out. This cannot be undone.')
    await user.click(screen.getByRole('button', { name: 'Close it now' }))
    expect(confirm).toHaveBeenCalledTimes(1)
    await user.keyboard('{Escape}')
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument()
    expect(screen.getByRole('button', { name: 'Close the round' })).toHaveFocus()
  })

  test('stays while the act is in progress', async () => {
    const user = userEvent.setup()
    render(<Closing busy />)
    await user.click(screen.getByRole('button', { name: 'Close the round' }))
    await user.keyboard('{Escape}')
    expect(screen.getByRole('dialog')).toBeInTheDocument()
  })
})

describe('waiting', () => {
  afterEach(() => vi.useRealTimers())

  test('shows nothing at first; then says what is awaited', () => {
    vi.useFakeTimers()
    const { container } = render(<Waiting label="Reading the rounds" />)
    expect(container).toHaveTextContent(/^$/)
    act(() => vi.advanceTimersByTime(299))
    expect(screen.getByRole('status')).toBeEmptyDOMElement()
    act(() => vi.advanceTimersByTime(1))
    expect(screen.getByRole('status')).toHaveTextContent('Reading the rounds')
  })
})

test('a line to copy is selected, and says so, where the browser gives no clipboard', async () => {
  const user = userEvent.setup()
  Object.defineProperty(navigator, 'clipboard', { value: undefined, configurable: true })
  render(<CopyLine label="Link for seat 3" value="https://scrim.example.org/join/9f3k2m7q" />)
  await user.click(screen.getByRole('button', { name: 'Copy: Link for seat 3' }))
  expect(screen.getByRole('status')).toHaveTextContent('Selected: copy it by hand')
  expect(window.getSelection()?.toString()).toBe('https://scrim.example.org/join/9f3k2m7q')
})
