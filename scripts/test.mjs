/**
 * npm test: from a fresh clone to `N passed, N failed`. `npm test -- unit api` runs the stages named. PostgreSQL
 * is a throw-away cluster of this run's own; nothing but Node's modules may be imported here.
 */
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { holdThrowAwayFolder, joinThrowAwayCluster, projectRoot, removeThrowAway } from './postgres.mjs'
import { ensureChromium } from './start/chromium.mjs'
import { ensurePackages, requireNode } from './start/install.mjs'
import { withLock } from './start/lock.mjs'
import { endChildren } from './start/processes.mjs'
import { runStage, stages } from './start/stages.mjs'

const say = (line) => console.log(line)
const place = { cluster: undefined, reports: undefined }

async function cleanUp() {
  if (place.reports) rmSync(place.reports, { recursive: true, force: true })
  if (place.cluster) await removeThrowAway(place.cluster)
}

let ending = false
function stop(code) {
  if (ending) return
  ending = true
  endChildren(1500)
    .then(cleanUp)
    .finally(() => process.exit(code))
}

function chosenStages(names) {
  const known = stages.map(({ name }) => name)
  const unknown = names.filter((name) => !known.includes(name))
  if (unknown.length > 0) {
    console.error(`There is no stage ${unknown.join(', ')}. Stages: ${known.join(' ')}.`)
    process.exit(2)
  }
  return stages.filter(({ name }) => names.length === 0 || names.includes(name))
}

async function prepare(chosen) {
  requireNode()
  mkdirSync(join(projectRoot, '.scrim'), { recursive: true, mode: 0o711 })
  await withLock(join(projectRoot, '.scrim', 'prepare.lock'), () => ensurePackages(projectRoot, say))
  if (chosen.some(({ browser }) => browser)) await ensureChromium(say)
  if (!chosen.some(({ database }) => database)) return {}
  place.cluster = await holdThrowAwayFolder()
  await joinThrowAwayCluster(place.cluster, { say })
  return { SCRIM_TEST_CLUSTER: place.cluster }
}

async function main() {
  const chosen = chosenStages(process.argv.slice(2).map((name) => name.toLowerCase()))
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) process.on(signal, () => stop(1))
  const parent = process.ppid
  if (process.env.npm_lifecycle_event) {
    setInterval(() => process.ppid !== parent && stop(1), 500).unref()
  }
  const plain = process.stdout.isTTY ? {} : { NO_COLOR: '1' }
  const env = { ...process.env, ...plain, ...(await prepare(chosen)) }
  place.reports = mkdtempSync(join(tmpdir(), 'scrim-reports-'))

  const total = { passed: 0, failed: 0 }
  let built = true
  for (const stage of chosen) {
    const from = process.hrtime.bigint()
    const outcome =
      stage.built && !built
        ? { passed: 0, failed: 1, output: 'Not run: the build failed.' }
        : await runStage(stage, { root: projectRoot, env, folder: place.reports })
    if (ending) return
    if (stage.name === 'build') built = outcome.failed === 0
    const seconds = Number(process.hrtime.bigint() - from) / 1e9
    if (outcome.output) console.log(`\n${outcome.output.trimEnd()}\n`)
    const { passed, failed } = outcome
    console.log(
      `${stage.name.padEnd(10)}${seconds.toFixed(1).padStart(7)} s  ${passed} passed, ${failed} failed`,
    )
    total.passed += passed
    total.failed += failed
  }
  await cleanUp()
  console.log(`${total.passed} passed, ${total.failed} failed`)
  process.exit(total.failed > 0 ? 1 : 0)
}

main().catch(async (error) => {
  if (ending) return
  console.error(error.message)
  await cleanUp().catch(() => {})
  console.log('0 passed, 1 failed')
  process.exit(1)
})
