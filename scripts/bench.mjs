/**
 * npm run bench [-- draw analysis requests]: how long the heavy parts take on this machine. Not part of the tests:
 * the figures belong to the machine.
 */
import { readdirSync } from 'node:fs'
import { join } from 'node:path'
import { ensurePackages } from './start/install.mjs'
import { spawnTracked } from './start/processes.mjs'
import { holdThrowAwayFolder, projectRoot, removeThrowAway } from './postgres.mjs'

const folder = join(projectRoot, 'scripts', 'bench')
const files = new Map(readdirSync(folder).map((name) => [name.split('.')[0], join(folder, name)]))
const asked = process.argv.slice(2)
const unknown = asked.filter((name) => !files.has(name))
if (unknown.length > 0) {
  console.error(`There is no bench ${unknown.join(', ')}. Benches: ${[...files.keys()].join(' ')}.`)
  process.exit(2)
}

await ensurePackages(projectRoot, console.log)
const cluster = await holdThrowAwayFolder()
const env = { ...process.env, NODE_ENV: 'production', SCRIM_TEST_CLUSTER: cluster }
try {
  for (const name of asked.length > 0 ? asked : files.keys()) {
    console.log(`${name}:`)
    const args = ['--import', 'tsx', files.get(name)]
    const child = spawnTracked(process.execPath, args, { cwd: projectRoot, env, stdio: 'inherit' })
    const code = await new Promise((resolve) => child.on('exit', resolve))
    if (code !== 0) process.exitCode = 1
  }
} finally {
  await removeThrowAway(cluster)
}
