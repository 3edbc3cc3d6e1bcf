/** The seal check asks three things of the sound; a "no" to any means seating the earphones anew, three times at most. */
export const sealQuestions = ['bass', 'both-ears', 'middle'] as const
export type SealQuestion = (typeof sealQuestions)[number]

export const mostReseats = 3

export interface SealCheck {
  at: SealQuestion | 'reseat' | 'other-tips' | 'no-seal' | 'sealed'
  reseats: number
  otherTips: boolean
  /** Something was answered "I can't tell". */
  unsure: boolean
}

export const sealStart: SealCheck = { at: 'bass', reseats: 0, otherTips: false, unsure: false }

/** Where a check stands that was told as "no seal" before this page was loaded. */
export const sealNone: SealCheck = { ...sealStart, at: 'no-seal' }

export type SealAnswer = 'yes' | 'no' | 'cant-tell' | 'done' | 'no-other-tips' | 'again'

/** One step of the seal check. `done` follows an instruction (seated anew, other tips on), `again` starts over. */
export function sealStep(check: SealCheck, answer: SealAnswer): SealCheck {
  if (answer === 'again') return sealStart
  if (check.at === 'reseat') return { ...check, at: 'bass', unsure: false }
  if (check.at === 'other-tips') {
    if (answer === 'no-other-tips') return { ...check, at: 'no-seal' }
    return { ...check, at: 'bass', otherTips: true, unsure: false }
  }
  if (check.at === 'no-seal' || check.at === 'sealed') return check
  if (answer === 'no') {
    if (check.otherTips) return { ...check, at: 'no-seal' }
    if (check.reseats >= mostReseats) return { ...check, at: 'other-tips' }
    return { ...check, at: 'reseat', reseats: check.reseats + 1 }
  }
  const next = sealQuestions[sealQuestions.indexOf(check.at) + 1]
  return { ...check, at: next ?? 'sealed', unsure: check.unsure || answer === 'cant-tell' }
}

/** What is told to the table when the questions are through: sealed, or not sure of it. */
export const sealOutcome = (check: SealCheck): 'yes' | 'unsure' | 'no' =>
  check.at === 'no-seal' ? 'no' : check.unsure ? 'unsure' : 'yes'
