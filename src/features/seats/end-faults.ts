/** The schema speaks of options where a choice was left open; a listener hears what to do. */
export function endFault(name: string, message: string): string {
  if (name === 'recognised') return 'Choose one: none, perhaps or yes.'
  if (name.endsWith('.code')) return 'Choose which of your codes it was.'
  if (name.endsWith('.sure')) return 'Say how sure you are.'
  return message
}
