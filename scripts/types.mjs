/** Checks the types of the four TypeScript projects, two at a time, and prints what each says. */
import { join } from 'node:path'
import { projectRoot } from './postgres.mjs'
import { run } from './start/processes.mjs'

const waiting = ['tests', 'server', 'client', 'shared']
const tsc = join(projectRoot, 'node_modules', 'typescript', 'bin', 'tsc')
let failed = false

async function work() {
  for (let name = waiting.shift(); name; name = waiting.shift()) {
    const args = [tsc, '-p', `tsconfig.${name}.json`, '--pretty', 'false']
    const { code, output } = await run(process.execPath, args, { cwd: projectRoot })
    if (code === 0) continue
    failed = true
    console.error(`${name}:\n${output}`)
  }
}

await Promise.all([work(), work()])
process.exitCode = failed ? 1 : 0
