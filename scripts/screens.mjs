/**
 * npm run screens [-- verdict,home]: pictures of every address, at 390 and 1280 pixels, light and dusk, into
 * ./screens. Starts the built application on a throw-away database with the demo's data; not part of the tests.
 * Names choose addresses of src/app/paths.ts or single pictures; `--list` prints them.
 */
import { join } from 'node:path'
import { build } from './build.mjs'
import { holdThrowAwayFolder, projectRoot, removeThrowAway } from './postgres.mjs'
import { ensureChromium } from './start/chromium.mjs'
import { ensurePackages } from './start/install.mjs'
import { endChildren, spawnTracked } from './start/processes.mjs'

const asked = process.argv.slice(2)
await ensurePackages(projectRoot, console.log)
const env = { ...process.env }
const listing = asked.includes('--list')
const folder = listing ? undefined : await holdThrowAwayFolder()
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => void end(130))

async function end(code) {
  await endChildren(900)
  if (folder) await removeThrowAway(folder)
  process.exit(code)
}

try {
  if (folder) {
    await build({ ifChanged: true, say: console.log })
    env.SCRIM_CHROMIUM = await ensureChromium(console.log)
    env.SCRIM_TEST_CLUSTER = folder
  }
  const walk = join(projectRoot, 'scripts', 'screens', 'walk.ts')
  const child = spawnTracked(process.execPath, ['--import', 'tsx', walk, ...asked], {
    cwd: projectRoot,
    env,
    stdio: 'inherit',
  })
  await end((await new Promise((resolve) => child.on('exit', resolve))) ?? 1)
} catch (error) {
  console.error(error)
  await end(1)
}
