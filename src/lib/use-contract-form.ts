import { zodResolver } from '@hookform/resolvers/zod'
import { useMemo, useState } from 'react'
import { useForm, type DefaultValues, type FieldValues } from 'react-hook-form'
import type { z } from 'zod'
import { faultsOf, placeFaults, type Fault, type Unplaced } from './form-faults.ts'

interface ContractForm<In extends FieldValues, Out extends FieldValues> {
  /** The contract's own schema: the browser refuses what the server would refuse. */
  schema: z.ZodType<Out, In>
  defaultValues: DefaultValues<In>
  send: (value: Out) => Promise<unknown>
  /** Whether the form has an input of this name; the rest of the server's faults are shown in the summary alone. */
  has?: (field: string) => boolean
}

const nothingLeft: Unplaced = { left: [], problem: null }

/**
 * A form over a contract's body: faults found here or by the server stand at their inputs and in the summary, and what
 * was typed stays typed. `problem` is a refusal that names no input.
 */
export function useContractForm<In extends FieldValues, Out extends FieldValues>({
  schema,
  defaultValues,
  send,
  has,
}: ContractForm<In, Out>) {
  const resolver = useMemo(() => zodResolver<In, unknown, Out>(schema as never), [schema])
  const form = useForm<In, unknown, Out>({ resolver, defaultValues, shouldFocusError: false })
  const [unplaced, setUnplaced] = useState<Unplaced>(nothingLeft)
  const [attempt, setAttempt] = useState(0)
  const again = () => setAttempt((count) => count + 1)
  const submit = form.handleSubmit(async (value) => {
    setUnplaced(nothingLeft)
    try {
      await send(value)
    } catch (error) {
      setUnplaced(placeFaults(error, form.setError, has))
      again()
    }
  }, again)
  const faults: Fault[] = [...faultsOf(form.formState.errors), ...unplaced.left]
  return {
    form,
    submit,
    attempt,
    faults,
    problem: unplaced.problem,
    busy: form.formState.isSubmitting,
    /** The fault at one input, for its `error`. */
    errorAt: (field: string): string | undefined => faults.find((fault) => fault.field === field)?.message,
  }
}
