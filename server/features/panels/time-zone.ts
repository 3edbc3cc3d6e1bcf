/** Whether this is a time zone by name (`Europe/Dublin`), as the IANA list in Node's ICU has it. */
export function isTimeZone(name: string): boolean {
  if (!/^[A-Za-z][\w+-]*(\/[\w+-]+)*$/.test(name)) return false
  try {
    new Intl.DateTimeFormat('en', { timeZone: name })
    return true
  } catch {
    return false
  }
}
