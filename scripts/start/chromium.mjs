import { existsSync } from 'node:fs'
import { installPackages } from './apt.mjs'

const places = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome']

/** The path of a Chromium on this machine, or nothing. */
export const findChromium = () => places.find((path) => existsSync(path))

/**
 * As `findChromium`, installing Debian's when there is none.
 * @param {(line: string) => void} say
 */
export async function ensureChromium(say) {
  if (!findChromium()) {
    say('Chromium is not installed: installing it')
    await installPackages(['chromium'], 'Chromium for its browser tests')
  }
  const path = findChromium()
  if (!path) throw new Error(`Chromium was installed, but is in none of ${places.join(', ')}.`)
  return path
}
