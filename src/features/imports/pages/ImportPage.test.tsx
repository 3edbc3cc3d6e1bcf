import { screen, waitFor } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { previewImport, storeImport } from '#shared/contracts/imports.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import { previewOf } from '../preview.ts'
import ImportPage from './ImportPage.tsx'

const good = `panelist,unit,descriptor,replicate,position,score
Ada,Dunlin,width,1,1,62
Ada,Knot,width,1,2,40
Bo,Dunlin,width,1,2,58
Bo,Knot,width,1,1,41
`
const withFault = `${good}Cy,Knot,width,1,1,loud\n`
const round = '11111111-1111-4111-8111-111111111111'

/** A server that reads what the browser reads, and stores unless `refuse` says no. */
function server(refuse: () => Refusal | null = () => null) {
  return fakeServer()
    .on(previewImport, ({ body }) => previewOf((body as { text: string }).text))
    .on(storeImport, () => refuse() ?? { round })
}

const open = () =>
  showPage(ImportPage, '/p/:panel/import', '/p/quayside-bench/import', {
    '/p/:panel/rounds/:round/agreement': 'Agreement is shown',
  })

const chooseFile = (text: string) =>
  userEvent.upload(
    screen.getByLabelText('Ratings file'),
    new File([text], 'evening.csv', { type: 'text/csv' }),
  )

async function nameIt() {
  await userEvent.type(await screen.findByLabelText('Title'), 'Two on a Tuesday')
  await userEvent.type(screen.getByLabelText('Question'), 'Which is wider?')
}
const store = () => userEvent.click(screen.getByText('Store the ratings'))

describe('importing ratings', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('shows what was read before anything is stored, and that Scrim reads the same', async () => {
    const asked = server()
    open()
    await chooseFile(good)
    expect(
      await screen.findByText(/4 rows: two listeners, two units \(Dunlin and Knot\)/),
    ).toBeInTheDocument()
    expect(await screen.findByText(/evening\.csv.*Scrim reads it the same way/)).toBeInTheDocument()
    expect(screen.getByText('Every row can be read.')).toBeInTheDocument()
    expect(asked.asked('storeImport')).toHaveLength(0)
  })

  it('names a bad row by line and reason and stores only when it is left out by choice', async () => {
    const asked = server()
    open()
    await chooseFile(withFault)
    expect(await screen.findByText('Line 6')).toBeInTheDocument()
    expect(screen.getByText(/The score “loud” is not a number/)).toBeInTheDocument()
    expect(screen.getByText(/or leave (it|them) out/)).toBeInTheDocument()
    await nameIt()
    await store()
    expect(asked.asked('storeImport')).toHaveLength(0)
    await userEvent.click(screen.getByLabelText(/^Leave (this row|these rows) out/))
    await store()
    expect(await screen.findByText('Agreement is shown')).toBeInTheDocument()
    expect(asked.asked('storeImport')[0]?.body).toMatchObject({ leaveOutFaults: true, text: withFault })
  })

  it('sends the same key when storing is tried again, so that it is stored once', async () => {
    let tries = 0
    const asked = server(() =>
      ++tries === 1 ? new Refusal('unavailable', 'Scrim is away for a moment.') : null,
    )
    open()
    await chooseFile(good)
    await nameIt()
    await store()
    expect(await screen.findByText('The file and what you typed are still here.')).toBeInTheDocument()
    await store()
    expect(await screen.findByText('Agreement is shown')).toBeInTheDocument()
    const keys = asked.asked('storeImport').map((one) => one.key)
    expect(keys).toHaveLength(2)
    expect(new Set(keys).size).toBe(1)
  })

  it('asks for a title and leads to it from the summary', async () => {
    server()
    open()
    await chooseFile(good)
    await screen.findByText('Every row can be read.')
    await store()
    await userEvent.click(await screen.findByText('Give the round a title.', { selector: 'a' }))
    await waitFor(() => expect(screen.getByLabelText('Title')).toHaveFocus())
  })

  it('reads rows that were pasted', async () => {
    server()
    open()
    await userEvent.click(screen.getByText('Paste the rows instead'))
    await userEvent.click(screen.getByLabelText('Rows with their header'))
    await userEvent.paste(good)
    await userEvent.click(screen.getByText('Read these rows'))
    expect(await screen.findByText(/Read: what you pasted/)).toBeInTheDocument()
  })
})
