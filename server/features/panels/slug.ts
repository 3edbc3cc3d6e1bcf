const longest = 60

/** Letters that a decomposition leaves whole. */
const spelled: Record<string, string> = {
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ø: 'o',
  ł: 'l',
  đ: 'd',
  ð: 'd',
  þ: 'th',
  ı: 'i',
}

/**
 * A name as a part of an address: lower case, a–z, digits and single hyphens, at most 60 characters. A name in another
 * script leaves nothing: then `panel`.
 *
 * @example slugOf('Žižkov Ear Club') // 'zizkov-ear-club'
 */
export function slugOf(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[ßæœøłđðþı]/g, (letter) => spelled[letter] ?? '')
    .replace(/['’]/g, '')
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, longest)
    .replace(/^-+|-+$/g, '')
  return plain === '' ? 'panel' : plain
}
