import { readFile } from 'node:fs/promises'
import { parseArgs } from 'node:util'
import { parseRatingsFile } from '#shared/domain/ratings-file.ts'
import type { FileProblem } from '#shared/domain/ratings-file.ts'
import { analyse, DEFAULT_DRAWS, DEFAULT_SEED } from '#shared/stats/analyse.ts'

const USAGE = 'npm run --silent analyse -- FILE.csv [--draws N] [--seed S] [--position]'
const MOST_ROWS = 2_000_000
const MOST_PROBLEMS = 100

interface Problem {
  readonly title: string
  readonly detail: string
  readonly problems?: readonly FileProblem[]
}

/** Runs the command; prints the analysis, or the problem on the error stream. Returns the exit code. */
export async function main(args: readonly string[]): Promise<number> {
  const wanted = readArguments(args)
  if ('title' in wanted) return refuse(wanted)
  let text: string
  try {
    text = await readFile(wanted.file, 'utf8')
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException
    return refuse({ title: 'The file cannot be read', detail: `${wanted.file}: ${code ?? String(error)}` })
  }
  const { rows, problems } = parseRatingsFile(text, MOST_ROWS)
  if (problems.length > 0) {
    const faults = problems.length === 1 ? 'one fault' : `${problems.length} faults`
    return refuse({
      title: 'The ratings file has faults',
      detail: `${faults}; nothing was analysed.`,
      problems: problems.slice(0, MOST_PROBLEMS),
    })
  }
  const { draws, seed, position } = wanted
  await write(process.stdout, JSON.stringify(analyse(rows, { draws, seed, position }), null, 2))
  return 0
}

interface Wanted {
  readonly file: string
  readonly draws: number
  readonly seed: string
  readonly position: boolean
}

function readArguments(args: readonly string[]): Wanted | Problem {
  const wrong = (detail: string): Problem => ({ title: 'How to call it', detail: `${detail} ${USAGE}` })
  try {
    const { values, positionals } = parseArgs({
      args: [...args],
      allowPositionals: true,
      options: {
        draws: { type: 'string', default: String(DEFAULT_DRAWS) },
        seed: { type: 'string', default: DEFAULT_SEED },
        position: { type: 'boolean', default: false },
      },
    })
    const [file, ...rest] = positionals
    if (!file || rest.length > 0) return wrong('Give one file.')
    if (!/^\d{1,7}$/.test(values.draws)) return wrong('--draws takes a whole number from 0 on.')
    return { file, draws: Number(values.draws), seed: values.seed, position: values.position }
  } catch (error) {
    return wrong(error instanceof Error ? `${error.message}.` : 'Unknown option.')
  }
}

async function refuse(problem: Problem): Promise<number> {
  await write(process.stderr, JSON.stringify(problem, null, 2))
  return 1
}

const write = (stream: NodeJS.WriteStream, text: string): Promise<void> =>
  new Promise((done) => stream.write(`${text}\n`, () => done()))
