import { limits } from '#shared/domain/limits.ts'

export interface FileText {
  text: string
  /** How the letters were read, where it was not UTF-8; null otherwise. */
  encoding: 'UTF-16' | 'Windows-1252' | null
}

const marks: [number[], string][] = [
  [[0xff, 0xfe], 'utf-16le'],
  [[0xfe, 0xff], 'utf-16be'],
]

/**
 * The text of a file as a spreadsheet may have saved it: UTF-8 (with or without a byte-order mark), UTF-16 by its mark,
 * else Windows-1252.
 */
export function decodeText(bytes: Uint8Array): FileText {
  for (const [mark, label] of marks)
    if (mark.every((byte, nth) => bytes[nth] === byte))
      return { text: new TextDecoder(label).decode(bytes), encoding: 'UTF-16' }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), encoding: null }
  } catch {
    return { text: new TextDecoder('windows-1252').decode(bytes), encoding: 'Windows-1252' }
  }
}

/** Why a chosen file cannot be taken, or null. */
export function refusedFile(file: { size: number }): string | null {
  if (file.size === 0) return 'The file is empty.'
  if (file.size > limits.importBytes)
    return `The file is larger than ${limits.importBytes / 1024 / 1024} MB. Leave out columns that Scrim does not read.`
  return null
}
