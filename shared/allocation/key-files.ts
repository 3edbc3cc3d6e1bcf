import type { Draw, FileText, History, KeyUnit, PlanContent } from './types.ts'

/** Lowercase hex SHA-256 of the UTF-8 bytes of a text: what `sha256sum` prints for the file. */
export function fingerprint(_text: string): string {
  throw new Error('not built yet')
}

export function planFile(_input: {
  round: string
  time: string
  nonce: string
  versions: Record<string, string>
  plan: PlanContent
}): FileText & { planDigest: string } {
  throw new Error('not built yet')
}

export function keyFile(_input: {
  round: string
  time: string
  nonce: string
  seed: string
  versions: Record<string, string>
  planDigest: string
  units: KeyUnit[]
  draw: Draw
  history: Pick<History, 'pairs' | 'codes'>
  previousKey: string | null
}): FileText {
  throw new Error('not built yet')
}
