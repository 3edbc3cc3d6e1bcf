import type { Sequelize } from 'sequelize'
import { initAnalysis } from './analysis.ts'
import { initAuditEvent } from './audit-event.ts'
import { initDemoMessage } from './demo-message.ts'
import { initDescriptor } from './descriptor.ts'
import { initEndAnswer } from './end-answer.ts'
import { initIdempotentAnswer } from './idempotent-answer.ts'
import { initImportedRating } from './imported-rating.ts'
import { initIncident } from './incident.ts'
import { initJob } from './job.ts'
import { initKeyEntry } from './key-entry.ts'
import { initKeyLetter } from './key-letter.ts'
import { initKeyListener } from './key-listener.ts'
import { initMember } from './member.ts'
import { initPanel } from './panel.ts'
import { initPhoto } from './photo.ts'
import { initRating } from './rating.ts'
import { initRound } from './round.ts'
import { initRoundRole } from './round-role.ts'
import { initRoundSecret } from './round-secret.ts'
import { initRoundUnit } from './round-unit.ts'
import { initRow } from './row.ts'
import { initRowPlace } from './row-place.ts'
import { initScorecard } from './scorecard.ts'
import { initSeat } from './seat.ts'
import { initServing } from './serving.ts'
import { initSitting } from './sitting.ts'
import { initSubmission } from './submission.ts'
import { initTagMark } from './tag-mark.ts'
import { initUnit } from './unit.ts'
import { initUser } from './user.ts'
import { initUserToken } from './user-token.ts'
import { initVerdict } from './verdict.ts'
import { initVerdictDraft } from './verdict-draft.ts'

/** Binds every table to one connection. Services join by ids in plain queries, so no association acts behind a name. */
export function initModels(sequelize: Sequelize): void {
  for (const init of [
    initAnalysis,
    initAuditEvent,
    initDemoMessage,
    initDescriptor,
    initEndAnswer,
    initIdempotentAnswer,
    initImportedRating,
    initIncident,
    initJob,
    initKeyEntry,
    initKeyLetter,
    initKeyListener,
    initMember,
    initPanel,
    initPhoto,
    initRating,
    initRound,
    initRoundRole,
    initRoundSecret,
    initRoundUnit,
    initRow,
    initRowPlace,
    initScorecard,
    initSeat,
    initServing,
    initSitting,
    initSubmission,
    initTagMark,
    initUnit,
    initUser,
    initUserToken,
    initVerdict,
    initVerdictDraft,
  ])
    init(sequelize)
}
