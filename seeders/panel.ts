import { hashPassword } from '#server/auth/passwords.ts'
import { setScope } from '#server/db/transaction.ts'
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

/**
 * The panel, those who sign in, and the listeners who never do.
 * @returns who organises; null where the panel stands already
 */
export async function seedPanel(deps: Deps, now: Date): Promise<{ userId: string } | null> {
  if (await Panel.findOne({ where: { slug: demoSlug } })) return null
  const { random } = deps
  const createdAt = new Date(now.getTime() - 400 * 24 * 3600 * 1000)
  const panel = await Panel.create({
    id: random.id(),
    slug: demoSlug,
    name: 'The Quayside Bench',
    timeZone: 'Europe/Dublin',
    createdAt,
  })
  await setScope(deps.sequelize, { panelId: panel.id })
  const member = (displayName: string, more: object = {}) => ({
    panelId: panel.id,
    id: random.id(),
    displayName,
    roles: ['panelist'],
    createdAt,
    ...more,
  })
  const users = []
  for (const { name, email, password } of demoSignIns)
    users.push(
      await User.create({
        id: random.id(),
        email,
        name,
        passwordHash: await hashPassword(password),
        createdAt,
      }),
    )
  await Member.bulkCreate([
    ...users.map(({ id, name, email }) =>
      member(name, { userId: id, email, roles: rolesOf[email] ?? ['panelist'] }),
    ),
    ...Object.keys(guests).map((name) => member(name)),
  ])
  return { userId: users[0]?.id ?? '' }
}
