import { join } from 'node:path'
import { paths } from '#src/app/paths.ts'
import { startDemo } from './application.ts'
import { setUpCamera } from './camera.ts'
import { castOf } from './cast.ts'
import { panelShots } from './panel-shots.ts'
import { publicShots } from './public-shots.ts'
import { seatShots } from './seat-shots.ts'
import { headed, settled, type Shot } from './shot.ts'

/** The seats come last: their pictures bring the evening to its end. */
const all: readonly Shot[] = [...publicShots, ...panelShots, ...seatShots]

const forgotten = Object.keys(paths).filter((name) => !all.some((shot) => shot.path === name))
if (forgotten.length > 0) throw new Error(`No picture shows ${forgotten.join(', ')}.`)

const asked = process.argv.slice(2).flatMap((text) => text.split(','))
if (asked.includes('--list')) {
  console.log(all.map(({ name }) => name).join('\n'))
  process.exit(0)
}
const wanted = all.filter(
  ({ name, path }) => asked.length === 0 || asked.includes(name) || asked.includes(path),
)
if (wanted.length === 0) throw new Error(`There is no picture ${asked.join(', ')}. See --list.`)

const demo = await startDemo()
const camera = await setUpCamera(demo.url, join(process.cwd(), 'screens'), process.env.SCRIM_CHROMIUM ?? '')
try {
  const cast = await castOf(demo.url)
  for (const shot of wanted) {
    const where = await shot.go(cast)
    const page = await camera.open(shot.who(cast))
    try {
      await page.goto(where)
      await headed(page)
      await settled(page)
      await shot.then?.(page, cast)
      await settled(page)
      await camera.take(page, shot.name)
      console.log(`  ${shot.name}`)
    } catch (error) {
      console.error(`  ${shot.name}: ${error instanceof Error ? error.message : String(error)}`)
      process.exitCode = 1
    } finally {
      await page.context().close()
    }
  }
} finally {
  await camera.close()
  await demo.stop()
}
