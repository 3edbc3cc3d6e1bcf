import { render, screen, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { expect, test } from 'vitest'
import { AgreementScale } from './AgreementScale.tsx'
import { HeardLine } from './HeardLine.tsx'
import { HeardLineMini } from './HeardLineMini.tsx'
import { PlanRows } from './PlanRows.tsx'
import { Threads } from './Threads.tsx'

const scale = {
  low: 0,
  high: 100,
  sided: 'two' as const,
  lowWord: 'cool, thin',
  midWord: 'neutral',
  highWord: 'warm, thick',
}

test('a heard line carries the same numbers as a table, with intervals and who could not tell', () => {
  render(
    <HeardLine
      title="Warmth"
      sentence="Fullness of low voices and cello"
      family="tonal-balance"
      scale={scale}
      rows={[
        {
          name: 'Dunlin',
          scores: [60, 70, 80],
          q1: 65,
          median: 70,
          q3: 75,
          adjusted: { mean: 69.6, low: 61.2, high: 78 },
          comparisonHalf: 5,
          n: 3,
          cantTell: 1,
        },
        { name: 'Knot', scores: [], q1: 0, median: 0, q3: 0, n: 0, cantTell: 3 },
      ]}
    />,
  )
  expect(screen.getByRole('img', { name: 'Warmth. Fullness of low voices and cello' })).toBeInTheDocument()
  const row = within(screen.getByRole('table', { hidden: true })).getByRole('row', {
    name: /^Dunlin/,
    hidden: true,
  })
  const cells = within(row).getAllByRole('cell', { hidden: true })
  expect(cells.map((cell) => cell.lastChild?.textContent)).toEqual([
    '70',
    '65 to 75',
    '70, 61 to 78',
    '3',
    '1',
  ])
})

test('the arrow keys follow one listener after another through the threads, and Escape lets go', async () => {
  const user = userEvent.setup()
  render(
    <Threads
      title="Warmth"
      sentence="Each thin line is one listener"
      family="tonal-balance"
      scale={scale}
      listeners={['Listener 1', 'Listener 2']}
      units={[
        { name: 'Whimbrel', mean: 70, scores: [60, 80] },
        { name: 'Avocet', mean: 38, scores: [40, null] },
      ]}
    />,
  )
  await user.tab()
  await user.keyboard('{ArrowRight}')
  expect(screen.getByRole('status')).toHaveTextContent('Listener 1: Avocet 40, Whimbrel 60')
  await user.keyboard('{ArrowRight}')
  expect(screen.getByRole('status')).toHaveTextContent('Listener 2: Avocet not rated, Whimbrel 80')
  await user.keyboard('{Escape}')
  expect(screen.getByRole('status')).not.toHaveTextContent('Listener')
})

test('agreement says its estimate, its interval and what the ends mean', () => {
  render(<AgreementScale label="Depth" estimate={0.09} low={-0.1} high={0.28} ends={false} />)
  expect(
    screen.getByRole('img', {
      name: 'Depth: agreement 0.09, between −0.10 and 0.28, on a line from chance at 0 to as one at 1',
    }),
  ).toBeInTheDocument()
  expect(screen.queryByText('chance')).not.toBeInTheDocument()
})

test('a small heard line names every unit, on more lines where two stand close', () => {
  render(
    <HeardLineMini
      family="staging"
      scale={scale}
      points={[
        { name: 'Avocet', value: 50 },
        { name: 'Knot', value: 50.4 },
        { name: 'Dunlin', value: 74 },
      ]}
    />,
  )
  expect(
    screen.getByRole('img', { name: 'From cool, thin to warm, thick: Dunlin 74, Knot 50, Avocet 50' }),
  ).toBeInTheDocument()
  for (const name of ['Avocet', 'Knot', 'Dunlin']) expect(screen.getByText(name)).toBeInTheDocument()
})

test('the rows of a plan are also a table that says rests and repeats', () => {
  render(
    <PlanRows
      title="Who hears what when"
      sentence="One thread per listener"
      turns={3}
      rows={[
        {
          name: 'Ines',
          places: [
            { turn: 1, label: 'Knot' },
            { turn: 3, label: 'Knot', repeat: true },
          ],
        },
      ]}
    />,
  )
  const row = screen.getByRole('row', { name: /^Ines/, hidden: true })
  const cells = within(row).getAllByRole('cell', { hidden: true })
  expect(cells.map((cell) => cell.lastChild?.textContent)).toEqual(['Knot', 'rest', 'Knot (again)'])
})
