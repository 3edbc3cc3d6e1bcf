import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'

// Control characters but tab and line feed, halves of a character, and the marks that can turn the reading direction of
// what follows.
const unseen = /[^\P{Cc}\t\n]|\p{Cs}|[\u200e\u200f\u202a-\u202e\u2066-\u2069\ufeff]/gu

const tidy = (text: string): string => text.normalize('NFC').replace(unseen, '').trim()

/** One line of text a person types: NFC, no control characters, trimmed, at least one character. */
export const line = (most: number, missing: string) =>
  z
    .string({ error: missing })
    .transform((text) => tidy(text).replace(/\s+/g, ' '))
    .pipe(z.string().min(1, missing).max(most, `At most ${most} characters.`))

/** Text of several lines; may be empty. */
export const prose = (most: number) =>
  z
    .string()
    .transform(tidy)
    .pipe(z.string().max(most, `At most ${most} characters.`))

export const emailAddress = z
  .string({ error: 'Enter an email address.' })
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email('Enter an address like name@example.org.').max(limits.email))

export const password = z
  .string({ error: 'Enter a password.' })
  .min(limits.passwordLeast, `At least ${limits.passwordLeast} characters.`)
  .max(limits.passwordMost, `At most ${limits.passwordMost} characters.`)

export const id = z.uuid()
export const slug = z
  .string()
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)
  .max(80)
export const instant = z.iso.datetime()
export const calendarDate = z.iso.date('Enter a date like 2026-03-12.')
export const threeDigits = z.string().regex(/^[1-9]\d\d$/, 'Three digits, as on the pouch.')
export const fingerprint = z.string().regex(/^[0-9a-f]{64}$/)
