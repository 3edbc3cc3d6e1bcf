/**
 * npm run --silent analyse -- FILE.csv [--draws N] [--seed S] [--position]
 *
 * Prints the analysis of a ratings file as JSON. The program is TypeScript: it is bundled on first use into
 * .scrim/analyse, under a name that changes with its sources, and run from there.
 */
import { createHash } from 'node:crypto'
import { access, mkdir, mkdtemp, readdir, readFile, rename, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { dirname, join, relative } from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'

const root = join(dirname(fileURLToPath(import.meta.url)), '..')
const sources = ['shared/stats', 'shared/domain', 'scripts/analyse']

const entry = await bundled()
const { main } = await import(pathToFileURL(entry).href)
process.exitCode = await main(process.argv.slice(2))

/** Path of the bundle for these sources, built if it is not there yet. */
async function bundled() {
  const name = await sourcesHash()
  const homes = [join(root, '.scrim', 'analyse'), join(tmpdir(), 'scrim-analyse')]
  for (const home of homes) {
    const file = join(home, name, 'command.js')
    if (await exists(file)) return file
  }
  for (const home of homes) {
    try {
      await mkdir(home, { recursive: true })
      return await build(home, name)
    } catch (error) {
      if (!['EACCES', 'EROFS', 'EPERM'].includes(error.code)) throw error
    }
  }
  throw new Error('analyse: no folder to write to, neither .scrim nor the temporary one')
}

async function sourcesHash() {
  const hash = createHash('sha256')
  const files = [join(root, 'package-lock.json')]
  for (const folder of sources) {
    for (const found of await readdir(join(root, folder), { recursive: true, withFileTypes: true })) {
      const path = join(found.parentPath ?? found.path, found.name)
      if (found.isFile() && path.endsWith('.ts') && !path.endsWith('.test.ts')) files.push(path)
    }
  }
  for (const file of files.sort()) hash.update(relative(root, file)).update(await readFile(file))
  return hash.digest('hex').slice(0, 16)
}

/** Builds beside the place and moves in when done, so that two at once do not meet half a file. */
async function build(home, name) {
  const { build: bundle } = await import('vite')
  const working = await mkdtemp(join(home, 'building-'))
  try {
    await bundle({
      root,
      configFile: false,
      logLevel: 'error',
      ssr: { noExternal: true },
      build: {
        ssr: join(root, 'scripts/analyse/command.ts'),
        outDir: working,
        emptyOutDir: false,
        target: 'node20',
        rollupOptions: { output: { entryFileNames: 'command.js', format: 'es' } },
      },
    })
    await rename(working, join(home, name)).catch(async (error) => {
      if (!(await exists(join(home, name, 'command.js')))) throw error
    })
  } finally {
    await rm(working, { recursive: true, force: true })
  }
  return join(home, name, 'command.js')
}

function exists(path) {
  return access(path).then(
    () => true,
    () => false,
  )
}
