/**
 * The ten pictures that docs/screens keeps, taken from ./screens: cut to what a reader of the documentation needs and
 * written with few colours. Run `npm run screens` first, then `npx tsx scripts/screens/keep.ts`.
 */
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import sharp from 'sharp'

/** Which picture becomes which file, and how much of its height is kept. */
const kept: readonly { from: string; to: string; height: number }[] = [
  { from: 'home-1280-light', to: 'home', height: 1200 },
  { from: 'verdict-1280-light', to: 'verdict-1280', height: 2600 },
  { from: 'verdict-390-dusk', to: 'verdict-390', height: 2000 },
  { from: 'agreement-1280-light', to: 'agreement', height: 2000 },
  { from: 'reveal-all-1280-dusk', to: 'reveal', height: 1000 },
  { from: 'plan-draft-1280-light', to: 'plan', height: 1500 },
  { from: 'table-1280-light', to: 'run-sheet', height: 1300 },
  { from: 'tags-390-light', to: 'pouches', height: 1400 },
  { from: 'seat-family-390-light', to: 'rating', height: 1200 },
  { from: 'seat-report-390-dusk', to: 'own-report', height: 1200 },
]

const folder = join('docs', 'screens')
mkdirSync(folder, { recursive: true })
for (const { from, to, height } of kept) {
  const picture = sharp(join('screens', `${from}.png`))
  const { width, height: whole } = await picture.metadata()
  const { size } = await picture
    .extract({ left: 0, top: 0, width, height: Math.min(height, whole) })
    .png({ palette: true, colours: 64, dither: 0, compressionLevel: 9, effort: 10 })
    .toFile(join(folder, `${to}.png`))
  console.log(`${to}.png ${Math.round(size / 1024)} kB`)
}
