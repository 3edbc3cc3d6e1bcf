import { useEffect } from 'react'
import type { UseFormReturn } from 'react-hook-form'
import { eveningDraft, type EveningDraft, type EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import type { Fault } from '#src/lib/form-faults.ts'
import type { Kept } from '#src/lib/kept.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'

export type EveningFormState = UseFormReturn<EveningDraftInput, unknown, EveningDraft>
export type ErrorAt = (field: string) => string | undefined

/** What a part of the evening's form needs. */
export interface EveningPart {
  form: EveningFormState
  errorAt: ErrorAt
}

/** The input that shows a fault: one entry holds all tracks, one group all descriptors, one list all people. */
export function inputOf(field: string): string {
  if (/^(tracks|scorecard)\./.test(field)) return field.slice(0, field.indexOf('.'))
  if (/^people\.\d+\.(listens|duty|steward|you)$/.test(field)) return 'people'
  if (/^units\.\d+\.id$/.test(field)) return field.replace(/id$/, 'name')
  return field
}

/** A fault as the summary says it, where several inputs may have the same: "Unit 2: Enter the maker." */
export function summed({ field, message }: Fault): Fault {
  const [, list, nth] = /^(units|people)\.(\d+)\./.exec(field) ?? []
  if (nth === undefined) return { field, message }
  return { field, message: `${list === 'units' ? 'Unit' : 'Person'} ${Number(nth) + 1}: ${message}` }
}

interface EveningForm {
  draft: EveningDraftInput
  /** Where this tab keeps what is typed. */
  kept: Kept<EveningDraftInput>
  send: (draft: EveningDraft) => Promise<unknown>
}

/** The evening's form: kept at each touch, its faults placed at the inputs that show them. */
export function useEveningForm({ draft, kept, send }: EveningForm) {
  const contract = useContractForm({ schema: eveningDraft, defaultValues: draft, send })
  const { form } = contract
  useEffect(() => {
    const { unsubscribe } = form.watch(() => kept.write(form.getValues()))
    return unsubscribe
  }, [form, kept])
  const faults = contract.faults.map(({ field, message }) => ({ field: inputOf(field), message }))
  const errorAt: ErrorAt = (field) => faults.find((fault) => fault.field === field)?.message
  return { ...contract, faults: faults.map(summed), errorAt }
}
