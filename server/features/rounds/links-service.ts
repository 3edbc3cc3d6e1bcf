import QRCode from 'qrcode'
import type { Handover } from '#shared/contracts/rounds.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { Seat } from '#server/models/seat.ts'
import { linkAddress, linkHash, linkToken, type LinkKind } from './link-service.ts'

const dutyNames: Record<string, string> = {
  keeper: 'Code keeper',
  letters: 'Units into lettered pouches',
  codes: 'Codes over the letters',
  steward: 'Steward',
}

async function handover(
  context: Context,
  what: LinkKind,
  link: { id: string; linkVersion: number; openedAt?: Date | null },
  label: string,
): Promise<Handover> {
  const url = linkAddress(context.deps, linkToken(context.deps, what, link.id, link.linkVersion))
  const qr = await QRCode.toString(url, { type: 'svg', margin: 1, errorCorrectionLevel: 'M' })
  return { what, label, id: link.id, url, qr, opened: Boolean(link.openedAt) }
}

const nameOf = async (memberId: string): Promise<string> =>
  (await Member.findByPk(memberId))?.displayName ?? ''

/** Links of seats, and of duties held by people who do not sign in. A keeper's link is not for the steward to hand out. */
export async function handoversOf(
  context: Context,
  roundId: string,
  withDuties: boolean,
): Promise<Handover[]> {
  const seats = await Seat.findAll({ where: { roundId, leftAt: null }, order: [['number', 'asc']] })
  const made = await Promise.all(seats.map((seat) => handover(context, 'seat', seat, seat.label)))
  if (!withDuties) return made
  const duties = await RoundRole.findAll({
    where: { roundId, role: ['keeper', 'letters', 'codes', 'steward'] },
  })
  for (const duty of duties)
    made.push(
      await handover(context, 'duty', duty, `${dutyNames[duty.role]}: ${await nameOf(duty.memberId)}`),
    )
  return made
}

/** A new link for a seat or duty of this round; the old one stops working. A seat's phones stay in; whoever opened a duty is out. */
export async function renew(
  context: Context,
  roundId: string,
  linkId: string,
  withDuties: boolean,
): Promise<Handover> {
  const seat = await Seat.findOne({ where: { roundId, id: linkId } })
  const duty = seat || !withDuties ? null : await RoundRole.findOne({ where: { roundId, id: linkId } })
  const link = seat ?? duty
  if (!link) throw notFound()
  const kind: LinkKind = seat ? 'seat' : 'duty'
  const wasOpened = Boolean(link.openedAt)
  const linkVersion = link.linkVersion + 1
  const renewed = {
    linkVersion,
    linkHash: linkHash(linkToken(context.deps, kind, link.id, linkVersion)),
    openedAt: null,
  }
  await (seat ? seat.update(renewed) : duty?.update(renewed))
  await putOnRecord(context, 'link renewed', {
    roundId,
    facts: { kind, role: duty?.role ?? 'panelist', wasOpened },
  })
  const label = seat ? seat.label : `${dutyNames[duty?.role ?? '']}: ${await nameOf(duty?.memberId ?? '')}`
  return handover(context, kind, link, label)
}
