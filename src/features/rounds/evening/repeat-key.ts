import { randomKey } from '#src/lib/random-key.ts'

/** The same key for the same words, so that a doubled or repeated press makes one round; other words get another. */
export function repeatKeys(make: () => string = randomKey): (words: unknown) => string {
  let last = { words: '', key: '' }
  return (words) => {
    const text = JSON.stringify(words)
    if (last.key === '' || last.words !== text) last = { words: text, key: make() }
    return last.key
  }
}
