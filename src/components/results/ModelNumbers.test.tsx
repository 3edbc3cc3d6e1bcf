import { render, screen, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { ModelNumbers } from './ModelNumbers.tsx'
import { machines, unsaid } from './result.fixture.ts'

/** The row of a table by the words of its caption and of its head; role queries over whole tables are slow. */
function rowOf(caption: RegExp, head: string): HTMLElement {
  const table = screen.getByText(caption).closest('table')
  if (!table) throw new Error(`No table is called ${caption}.`)
  const row = within(table).getByText(head, { selector: 'th' }).closest('tr')
  if (!row) throw new Error(`No row is called ${head}.`)
  return row
}

describe('the model behind a descriptor', () => {
  it('shows the published variance components of the Machines data by the names of the model', () => {
    // Pinheiro & Bates, Machines, REML: worker 22.858444, worker:machine 13.909457, residual 0.924630, criterion 215.687568.
    render(<ModelNumbers result={machines} />)
    expect(rowOf(/variance components/, 'panelist')).toHaveTextContent('22.8584')
    expect(rowOf(/variance components/, 'panelist:unit')).toHaveTextContent('13.9095')
    expect(rowOf(/variance components/, 'residual')).toHaveTextContent('0.9246')
    expect(screen.getByText(/criterion 215\.6876/)).toBeInTheDocument()
  })

  it('lists every pair with its simultaneous interval and its p', () => {
    render(<ModelNumbers result={machines} />)
    const row = rowOf(/every pair of units/, 'A − B')
    expect(row).toHaveTextContent('−7.97')
    expect(row).toHaveTextContent('between −13.93 and −2.00')
    expect(row).toHaveTextContent('2.1770')
    expect(row).toHaveTextContent('0.011')
  })

  it('names the method of the adjusted means', () => {
    render(<ModelNumbers result={machines} />)
    expect(screen.getByText(/adjusted by REML, Kenward–Roger, with 95 % interval/)).toBeInTheDocument()
  })

  it('explains a component that is estimated at zero', () => {
    if (!('formula' in machines.model)) throw new Error('The example has a model.')
    render(
      <ModelNumbers result={{ ...machines, model: { ...machines.model, boundary: ['panelist:unit'] } }} />,
    )
    expect(screen.getByText(/no sign that listeners order the units differently/)).toBeInTheDocument()
  })

  it('says why where there is no model, and still gives the plain means', () => {
    render(<ModelNumbers result={unsaid} />)
    expect(screen.getByText('Only one listener rated it.')).toBeInTheDocument()
    expect(rowOf(/means of each unit/, 'A')).toHaveTextContent('52.00')
    expect(document.body.textContent).not.toMatch(/NaN|null|undefined/)
  })
})
