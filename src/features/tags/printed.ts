import type { Tags } from '#shared/contracts/tags.ts'

/** What is printed: the sheet's head and rows (for whoever tags, never for the table) and the signs to cut out. */
export interface Printed {
  head: string[]
  rows: string[][]
  /** Digits or letters alone, sorted, so that their order tells nothing. */
  cards: string[]
}

const sorted = (signs: string[]): string[] => [...new Set(signs)].sort()

export function printed(tags: Tags): Printed {
  switch (tags.part) {
    case 'keeper': {
      const rows = [...tags.pouches]
        .sort((a, b) => a.turn - b.turn || a.seat.localeCompare(b.seat, 'en', { numeric: true }))
        .map((pouch) => [String(pouch.turn), pouch.seat, pouch.code, pouch.unit, pouch.maker])
      const reserves = tags.reserves.map((pouch) => [
        'reserve',
        pouch.seat,
        pouch.code,
        pouch.unit,
        pouch.maker,
      ])
      return {
        head: ['Turn', 'Seat', 'Code', 'Unit', 'Maker'],
        rows: [...rows, ...reserves],
        cards: sorted([...tags.pouches, ...tags.reserves].map(({ code }) => code)),
      }
    }
    case 'letters':
      return {
        head: ['Letter', 'Unit', 'Maker'],
        rows: tags.pouches.map(({ letter, unit, maker }) => [letter, unit, maker]),
        cards: sorted(tags.pouches.map(({ letter }) => letter)),
      }
    case 'codes':
      return {
        head: ['Letter', 'Code', 'Reserve'],
        rows: tags.pouches.map(({ letter, code, reserve }) => [letter, code, reserve]),
        cards: sorted(tags.pouches.flatMap(({ code, reserve }) => [code, reserve])),
      }
  }
}
