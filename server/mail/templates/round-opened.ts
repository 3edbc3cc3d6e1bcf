import type { Message } from '../mailer.ts'

export interface RoundOpened {
  to: string
  name: string
  panelName: string
  /** Title and question are read by listeners and carry no unit's name; neither does this mail. */
  roundTitle: string
  /** The round's public page. */
  url: string
  /** SHA-256 of plan.json and key.json, 64 hex digits each. */
  planFingerprint: string
  keyFingerprint: string
}

/** What everybody with a role in the round gets at opening: both fingerprints, to hold against the files later. */
export const roundOpened = (round: RoundOpened): Message => ({
  to: round.to,
  subject: `Open: ${round.roundTitle}`,
  text: `Hello ${round.name},

${round.panelName} opened the round “${round.roundTitle}”. Rows and codes are drawn and the plan is frozen.

Keep this mail. When the round is closed, its plan and its key are published as two files; if these fingerprints
match them, nothing was changed in between.

plan.json, SHA-256
${round.planFingerprint}

key.json, SHA-256
${round.keyFingerprint}

The round's public page: ${round.url}
`,
})
