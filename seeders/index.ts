import type { Deps } from '#server/deps.ts'
import { seedPanel } from './panel.ts'
import { seededRandom } from './seeded-random.ts'

/**
 * The demo's invented world, made once: the same ids at every seeding, dates relative to the day of it. Runs under the
 * lock of the migrations, as the application's own role and through its own services.
 */
export async function seedDemo(deps: Deps): Promise<void> {
  const seeded: Deps = { ...deps, random: seededRandom('The Quayside Bench') }
  await seedPanel(seeded)
}
