import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { blindings, roundStatuses } from '#shared/domain/round-status.ts'
import { endpoint } from './endpoint.ts'
import { calendarDate, id, instant, line, slug } from './text.ts'

export const atPanel = z.strictObject({ panel: slug })

export const panel = z.strictObject({
  slug,
  name: z.string(),
  timeZone: z.string(),
  version: z.number().int(),
  you: z.strictObject({ memberId: id, name: z.string(), roles: z.array(z.string()) }),
  can: z.strictObject({ startRound: z.boolean(), edit: z.boolean(), seeUnits: z.boolean() }),
})
export type Panel = z.infer<typeof panel>

export const roundLine = z.strictObject({
  id,
  number: z.number().int(),
  title: z.string(),
  status: z.enum(roundStatuses),
  origin: z.enum(['live', 'imported']),
  blinding: z.enum(blindings),
  listeners: z.number().int(),
  changedAt: instant,
  verdictSlug: slug.nullable(),
})
export type RoundLine = z.infer<typeof roundLine>

export const unitLine = z.strictObject({
  id,
  maker: z.string(),
  name: z.string(),
  provenance: z.string().nullable(),
  disclosure: z.string().nullable(),
  price: z.strictObject({ minor: z.number().int(), currency: z.string(), on: calendarDate }).nullable(),
  rounds: z.number().int(),
})
export const memberLine = z.strictObject({
  id,
  name: z.string(),
  roles: z.array(z.string()),
  signsIn: z.boolean(),
})

export const editPanel = z.strictObject({
  name: line(limits.name, 'Name your panel.'),
  timeZone: z.string().min(1).max(64),
})

export const getPanel = endpoint('GET /api/panels/:panel', {
  id: 'getPanel',
  audience: 'panel',
  summary: 'One panel, as its member sees it',
  params: atPanel,
  response: panel,
})
export const changePanel = endpoint('PATCH /api/panels/:panel', {
  id: 'changePanel',
  audience: 'panel',
  summary: 'Rename a panel or move its time zone',
  params: atPanel,
  body: editPanel,
  response: panel,
  versioned: true,
})
export const listRounds = endpoint('GET /api/panels/:panel/rounds', {
  id: 'listRounds',
  audience: 'panel',
  summary: 'The panel’s rounds, newest first',
  params: atPanel,
  response: z.strictObject({ rounds: z.array(roundLine) }),
})
export const listUnits = endpoint('GET /api/panels/:panel/units', {
  id: 'listUnits',
  audience: 'panel',
  summary: 'The panel’s units; those of an open round are withheld from its listeners and stewards',
  params: atPanel,
  response: z.strictObject({ units: z.array(unitLine), withheld: z.number().int() }),
})
export const listMembers = endpoint('GET /api/panels/:panel/members', {
  id: 'listMembers',
  audience: 'panel',
  summary: 'The people of the panel',
  params: atPanel,
  response: z.strictObject({ members: z.array(memberLine) }),
})
