import { describe, expect, it, vi } from 'vitest'
import { CallError } from './call.ts'
import { faultsOf, placeFaults } from './form-faults.ts'

const refusal = (fields?: Record<string, string>) =>
  new CallError({
    type: 'about:blank',
    title: 'Refused',
    status: 422,
    detail: 'Look at the fields.',
    code: 'invalid',
    requestId: 'r-7',
    ...(fields ? { fields } : {}),
  })

describe('the faults of a form', () => {
  it('are named by the input’s own name, in lists too', () => {
    const faults = faultsOf({
      title: { type: 'custom', message: 'Give it a title.' },
      units: [undefined, { name: { type: 'custom', message: 'Enter the name.' } }],
    } as never)
    expect(faults).toEqual([
      { field: 'title', message: 'Give it a title.' },
      { field: 'units.1.name', message: 'Enter the name.' },
    ])
  })

  it('of a whole list keep the list’s name beside those of its entries', () => {
    const people = Object.assign([{ name: { type: 'custom', message: 'Enter a name.' } }], {
      root: { type: 'custom', message: 'Choose one steward.' },
    })
    expect(faultsOf({ people } as never)).toEqual([
      { field: 'people.0.name', message: 'Enter a name.' },
      { field: 'people', message: 'Choose one steward.' },
    ])
  })
})

describe('the faults that the server found', () => {
  it('are placed at their inputs, and those without an input are left', () => {
    const setError = vi.fn()
    const { left, problem } = placeFaults(
      refusal({ email: 'Taken.', first: 'Too old.' }),
      setError,
      (field) => field === 'email',
    )
    expect(setError.mock.calls).toEqual([['email', { type: 'server', message: 'Taken.' }]])
    expect(left).toEqual([{ field: 'first', message: 'Too old.' }])
    expect(problem).toBeNull()
  })

  it('that name no input leave the whole refusal to be shown', () => {
    const error = refusal()
    expect(placeFaults(error, vi.fn())).toEqual({ left: [], problem: error })
  })

  it('are not mistaken for a fault of the program, which is thrown on', () => {
    expect(() => placeFaults(new TypeError('broken'), vi.fn())).toThrow('broken')
  })
})
