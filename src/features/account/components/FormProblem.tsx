import { Problem } from '#src/components/asked/Problem.tsx'
import type { CallError } from '#src/lib/call.ts'

/** A refusal that names no input. */
export const FormProblem = ({ problem }: { problem: CallError | null }) =>
  problem && <Problem error={problem} kept="What you typed is still here." />
