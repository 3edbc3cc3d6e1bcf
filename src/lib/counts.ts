const words = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
]

/** A count as a sentence says it: in words up to twelve, then in digits. */
export const numberWord = (n: number): string => words[n] ?? String(n)

/** `counted(1, 'unit')` is "one unit", `counted(3, 'unit')` "three units"; `many` where the plural is not "+s". */
export const counted = (n: number, one: string, many = `${one}s`): string =>
  `${numberWord(n)} ${n === 1 ? one : many}`

/** With a capital first letter, for the beginning of a sentence. */
export const sentenceCase = (text: string): string => text.charAt(0).toLocaleUpperCase('en') + text.slice(1)

/** "Ada", "Ada and Bo", "Ada, Bo and Cy". */
export function listed(names: readonly string[]): string {
  if (names.length < 2) return names[0] ?? ''
  return `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`
}

/** Minutes as people say them: "about 50 minutes", "about 1 h 40 min". */
export function spokenMinutes(minutes: number): string {
  const rounded = Math.max(5, Math.round(minutes / 5) * 5)
  if (rounded < 60) return `about ${rounded} minutes`
  const hours = Math.floor(rounded / 60)
  const rest = rounded % 60
  return rest === 0
    ? `about ${hours === 1 ? 'an hour' : `${numberWord(hours)} hours`}`
    : `about ${hours} h ${rest} min`
}
