/** What the rule about new accounts may look at. */
export interface SignUpFacts {
  /** The demo, or an installation that is set to take anybody. */
  open: boolean
  /** Whether somebody has an account here already. */
  anybodyYet: boolean
  /** Whether the first organiser's one-time address was used to come. */
  byFirstAddress: boolean
}

/** Until there is a first organiser the one-time address alone lets in, so that no stranger can be faster. */
export const maySignUp = (facts: SignUpFacts): boolean =>
  facts.open || (!facts.anybodyYet && facts.byFirstAddress)
