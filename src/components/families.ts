/** What a line on a scorecard belongs to. Liking stands apart from the three families of descriptors. */
export type Family = 'tonal-balance' | 'staging' | 'timbre' | 'liking'

export const familyWords: Record<Family, string> = {
  'tonal-balance': 'Tonal balance',
  staging: 'Staging',
  timbre: 'Timbre',
  liking: 'Overall liking',
}
