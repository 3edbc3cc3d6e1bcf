/**
 * Seeded stream of numbers in [0, 1) with 32 random bits each: sfc32 (Doty-Humphrey, PractRand), its 128-bit state
 * mixed from the seed text by xmur3-style hashing. Same seed, same stream, on every machine.
 *
 * For Monte-Carlo statistics only; codes and orders of a round come from the draw's own cryptographic stream.
 *
 * @param seed any text
 * @example
 * seededRandom('a')() === seededRandom('a')() // => true
 */
export function seededRandom(seed: string): () => number {
  const hash = mixer(seed)
  let a = hash()
  let b = hash()
  let c = hash()
  let counter = 1
  const next = (): number => {
    const out = (((a + b) | 0) + counter) | 0
    counter = (counter + 1) | 0
    a = b ^ (b >>> 9)
    b = (c + (c << 3)) | 0
    c = ((c << 21) | (c >>> 11)) + out
    return (out >>> 0) / 4294967296
  }
  for (let i = 0; i < 16; i++) next()
  return next
}

function mixer(text: string): () => number {
  let h = 1779033703 ^ text.length
  for (let i = 0; i < text.length; i++) {
    h = Math.imul(h ^ text.charCodeAt(i), 3432918353)
    h = (h << 13) | (h >>> 19)
  }
  return () => {
    h = Math.imul(h ^ (h >>> 16), 2246822507)
    h = Math.imul(h ^ (h >>> 13), 3266489909)
    h ^= h >>> 16
    return h | 0
  }
}

/** Shuffles `items` in place from `start` on (Fisher–Yates). */
export function shuffle(items: number[] | Float64Array, random: () => number, start = 0): void {
  for (let i = items.length - 1; i > start; i--) {
    const j = start + Math.floor(random() * (i - start + 1))
    const kept = items[i] ?? 0
    items[i] = items[j] ?? 0
    items[j] = kept
  }
}
