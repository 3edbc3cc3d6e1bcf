import { existsSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { run } from './processes.mjs'

/**
 * What a stage says of itself.
 * @typedef {{ passed: number, failed: number, output: string }} Outcome
 */

/** The stages of `npm test` in their order; those with a project are Vitest's. */
export const stages = [
  { name: 'format', command: ['prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.'] },
  { name: 'lint', command: ['eslint/bin/eslint.js', '.', '--max-warnings', '0'] },
  { name: 'types', script: 'scripts/types.mjs' },
  { name: 'unit', project: 'unit' },
  { name: 'component', project: 'component' },
  { name: 'api', project: 'api', database: true },
  { name: 'build', script: 'scripts/build.mjs' },
  { name: 'e2e', project: 'e2e', database: true, browser: true, built: true },
]

/**
 * Runs one stage to its end.
 * @param {typeof stages[number]} stage
 * @param {{ root: string, env: NodeJS.ProcessEnv, folder: string }} at folder: for the report
 * @returns {Promise<Outcome>}
 */
export async function runStage(stage, { root, env, folder }) {
  if (stage.project) return runVitest(stage.project, { root, env, folder })
  const args = stage.script
    ? [join(root, stage.script)]
    : [join(root, 'node_modules', stage.command[0]), ...stage.command.slice(1)]
  const { code, output } = await run(process.execPath, args, { cwd: root, env })
  return code === 0 ? { passed: 1, failed: 0, output: '' } : { passed: 0, failed: 1, output }
}

async function runVitest(project, { root, env, folder }) {
  const report = join(folder, `${project}.json`)
  rmSync(report, { force: true })
  const vitest = join(root, 'node_modules', 'vitest', 'vitest.mjs')
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const args = [vitest, 'run', '--project', project, ...reporters]
  const { code, output } = await run(process.execPath, args, { cwd: root, env: { ...env, NODE_ENV: 'test' } })
  const counted = existsSync(report) ? countReport(JSON.parse(readFileSync(report, 'utf8'))) : undefined
  const { passed, failed } = counted ?? { passed: 0, failed: 1 }
  // An error outside every test fails the run without failing a test; so does a stage without any test.
  const missed = failed === 0 && (code !== 0 || passed === 0) ? 1 : 0
  return { passed, failed: failed + missed, output: failed + missed > 0 ? output : '' }
}

/**
 * Tests of a report that passed and failed; a file that could not be loaded is one that failed.
 * @param {{ numPassedTests: number, numFailedTests: number,
 *   testResults: { status: string, assertionResults: unknown[] }[] }} report
 */
export function countReport(report) {
  const broken = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  )
  return { passed: report.numPassedTests, failed: report.numFailedTests + broken.length }
}
