import { hashPassword } from '#server/auth/passwords.ts'
import { inTransaction } from '#server/db/transaction.ts'
import type { Deps } from '#server/deps.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'
import { User } from '#server/models/user.ts'
import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { guests } from './people.ts'

export const demoSlug = 'the-quayside-bench'

const rolesOf: Record<string, string[]> = {
  'ines@example.org': ['organiser', 'keeper', 'steward', 'panelist', 'editor'],
  'tomas@example.org': ['keeper'],
  'wanda@example.org': ['steward', 'panelist'],
}

/** The panel, those who sign in, and the listeners who never do. Does nothing where the panel stands already. */
export async function seedPanel(deps: Deps): Promise<void> {
  const { random, clock } = deps
  const founded = new Date(clock.now().getTime() - 400 * 24 * 3600 * 1000)
  await inTransaction(deps.sequelize, {}, async () => {
    if (await Panel.findOne({ where: { slug: demoSlug } })) return
    const panel = await Panel.create({
      id: random.id(),
      slug: demoSlug,
      name: 'The Quayside Bench',
      timeZone: 'Europe/Dublin',
      createdAt: founded,
    })
    for (const { name, email, password } of demoSignIns) {
      const user = await User.create({
        id: random.id(),
        email,
        name,
        passwordHash: await hashPassword(password),
        createdAt: founded,
      })
      await Member.create({
        panelId: panel.id,
        id: random.id(),
        userId: user.id,
        displayName: name,
        email,
        roles: rolesOf[email] ?? ['panelist'],
        createdAt: founded,
      })
    }
    for (const displayName of guests)
      await Member.create({
        panelId: panel.id,
        id: random.id(),
        displayName,
        roles: ['panelist'],
        createdAt: founded,
      })
  })
}
