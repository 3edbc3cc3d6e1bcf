import { newToken, tokenDigest } from '#server/auth/tokens.ts'
import type { Deps } from '#server/deps.ts'
import { resetLink } from '#server/mail/templates/reset-link.ts'
import { User } from '#server/models/user.ts'
import { UserToken } from '#server/models/user-token.ts'

export const resetLinkLasts = 3600_000

/**
 * Looks the address up only here, so that asking takes as long for an address nobody has. The link is made, mailed and
 * kept as its digest in one transaction: what is not sent does not work.
 */
export async function sendResetLink({ email }: { email: string }, deps: Deps): Promise<void> {
  const user = await User.findOne({ where: { email } })
  if (!user) return
  const token = newToken(deps)
  await UserToken.create({
    id: deps.random.id(),
    userId: user.id,
    kind: 'reset',
    tokenHash: tokenDigest(token),
    expiresAt: new Date(deps.clock.now().getTime() + resetLinkLasts),
  })
  await deps.mail.send(
    resetLink({ to: user.email, name: user.name, url: `${deps.env.address}/reset/${token}` }),
  )
}
