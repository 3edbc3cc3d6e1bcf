import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import type { PublicRound, Round } from '#shared/contracts/rounds.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'

interface DescriptorRow {
  key: string
  name: string
  family: Descriptor['family']
  sentence: string
  scaleLow: number
  scaleHigh: number
  step: number
  sided: Descriptor['sided']
  lowWords: string
  middleWords: string | null
  highWords: string
}

export const presentDescriptor = (row: DescriptorRow): Descriptor => ({
  key: row.key,
  name: row.name,
  family: row.family,
  sentence: row.sentence,
  scale: { low: row.scaleLow, high: row.scaleHigh, step: row.step },
  sided: row.sided,
  words: { low: row.lowWords, middle: row.middleWords, high: row.highWords },
})

interface RoundRow {
  id: string
  number: number
  title: string
  question: string
  status: Round['status']
  origin: Round['origin']
  blinding: Round['blinding']
  version: number
  primaryDescriptor: string
  publishesRows: boolean
  planFingerprint: string | null
  keyFingerprint: string | null
  openedAt: Date | null
  closedAt: Date | null
  cancelledAt: Date | null
  cancelReason: string | null
}

const instant = (date: Date | null): string | null => date?.toISOString() ?? null

/** How the evening was planned, as far as the screen shows it. */
export interface PlanFacts {
  tracks: string[]
  sourceChain: string
  levelMatching: Round['levelMatching']
  hiding: string
}

export interface RoundParts {
  units: { id: string; maker: string; name: string }[] | null
  unitCount: number
  people: Round['people']
  scorecard: DescriptorRow[]
  plan: PlanFacts
  turns: Round['plan']
  sittingId: string | null
  verdictSlug: string | null
  draft: EveningDraftInput | null
  lacks: string[]
  you: Round['you']
  can: Round['can']
}

/** The round for its organiser and for its other people; `units` is null for whoever may not see them. */
export const presentRound = (row: RoundRow, parts: RoundParts): Round => ({
  id: row.id,
  number: row.number,
  title: row.title,
  question: row.question,
  status: row.status,
  origin: row.origin,
  blinding: row.blinding,
  version: row.version,
  units: parts.units?.map(({ id, maker, name }) => ({ id, maker, name })) ?? null,
  unitCount: parts.unitCount,
  people: parts.people,
  scorecard: parts.scorecard.map(presentDescriptor),
  primaryDescriptor: row.primaryDescriptor,
  tracks: parts.plan.tracks,
  sourceChain: parts.plan.sourceChain,
  levelMatching: parts.plan.levelMatching,
  hiding: parts.plan.hiding,
  publishesRows: row.publishesRows,
  plan: parts.turns,
  sittingId: parts.sittingId,
  planFingerprint: row.planFingerprint,
  keyFingerprint: row.keyFingerprint,
  openedAt: instant(row.openedAt),
  closedAt: instant(row.closedAt),
  cancelReason: row.cancelReason,
  verdictSlug: parts.verdictSlug,
  draft: parts.draft,
  lacks: parts.lacks,
  you: parts.you,
  can: parts.can,
})

export const presentPublicRound = (
  row: RoundRow,
  parts: {
    panelName: string
    unitCount: number
    listeners: number
    turns: number
    scorecard: DescriptorRow[]
    plan: PlanFacts
    verdictSlug: string | null
    keyIsPublic: boolean
  },
): PublicRound => ({
  id: row.id,
  panelName: parts.panelName,
  title: row.title,
  question: row.question,
  status: row.status,
  blinding: row.blinding,
  openedAt: instant(row.openedAt),
  closedAt: instant(row.closedAt),
  cancelledAt: instant(row.cancelledAt),
  cancelReason: row.cancelReason,
  unitCount: parts.unitCount,
  listeners: parts.listeners,
  scorecard: parts.scorecard.map(presentDescriptor),
  primaryDescriptor: row.primaryDescriptor,
  tracks: parts.plan.tracks,
  levelMatching: parts.plan.levelMatching,
  hiding: parts.plan.hiding,
  turns: parts.turns,
  planFingerprint: row.planFingerprint ?? '',
  keyFingerprint: row.keyFingerprint ?? '',
  verdictSlug: parts.verdictSlug,
  keyIsPublic: parts.keyIsPublic,
})
