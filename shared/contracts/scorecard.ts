import { z } from 'zod'
import { families } from '#shared/domain/lexicon.ts'

/** One thing rated, as every screen shows it. Scale ends in the scale's own units (0–100, or as the imported file has them). */
export const descriptor = z.strictObject({
  key: z.string(),
  name: z.string(),
  family: z.enum(families),
  sentence: z.string(),
  scale: z.strictObject({ low: z.number(), high: z.number(), step: z.number() }),
  sided: z.enum(['one', 'two']),
  words: z.strictObject({ low: z.string(), middle: z.string().nullable(), high: z.string() }),
})
export type Descriptor = z.infer<typeof descriptor>
