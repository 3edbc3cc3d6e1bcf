import { day } from '#src/lib/dates.ts'
import { listed, numberWord, sentenceCase } from '#src/lib/counts.ts'
import type { Provenance } from './disclosure-wording.ts'

interface Unit {
  name: string
  provenance: Provenance | null
  lender: string | null
  returnOn: string | null
}

const from = (unit: Unit): string => {
  const lender = unit.lender ? ` ${unit.provenance === 'gift' ? 'by' : 'from'} ${unit.lender}` : ''
  const until = unit.returnOn ? ` until ${day(unit.returnOn, 'UTC')}` : ''
  return lender + until
}

/** Units whose facts read the same, under one wording. */
function grouped(units: readonly Unit[], wording: (unit: Unit) => string): [string, string[]][] {
  const groups = new Map<string, string[]>()
  for (const unit of units) {
    const key = wording(unit)
    groups.set(key, [...(groups.get(key) ?? []), unit.name])
  }
  return [...groups]
}

/**
 * Who paid, in a few sentences: how many were bought, and by name everything that was lent, given, discounted or not
 * yet for sale. "Four of six units were bought. Dunlin and Avocet: on loan from a shop until 30 November 2026."
 */
export function whoPaid(units: readonly Unit[]): string[] {
  const said: string[] = []
  const bought = units.filter((unit) => unit.provenance === 'bought')
  if (bought.length === units.length && units.length > 0)
    said.push(`All ${numberWord(units.length)} units were bought.`)
  else if (bought.length > 0)
    said.push(
      `${sentenceCase(numberWord(bought.length))} of ${numberWord(units.length)} units ${bought.length === 1 ? 'was' : 'were'} bought.`,
    )
  const named: [Provenance, string][] = [
    ['loan', 'on loan'],
    ['gift', 'given'],
    ['discounted', 'bought at a discount'],
    ['prototype', 'prototype'],
  ]
  for (const [provenance, words] of named)
    for (const [detail, names] of grouped(
      units.filter((unit) => unit.provenance === provenance),
      from,
    ))
      said.push(`${listed(names)}: ${words}${detail}.`)
  const silent = units.filter((unit) => unit.provenance === null).map((unit) => unit.name)
  if (silent.length > 0) said.push(`${listed(silent)}: not said.`)
  return said
}
