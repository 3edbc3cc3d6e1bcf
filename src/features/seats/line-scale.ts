import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { LineScale } from '#src/components/rating/answer.ts'

/** A descriptor's scale as the rating line takes it. */
export const lineScale = ({ scale, sided, words }: Descriptor): LineScale => ({
  ...scale,
  sided,
  lowWord: words.low,
  highWord: words.high,
  ...(words.middle === null ? {} : { midWord: words.middle }),
})
