import { isBlinded, mayOrganise, type RoundFacts } from './round.ts'

/** What a rule about a panel may look at. */
export interface PanelFacts {
  roles: readonly string[]
}

export const mayRunPanel = (facts: PanelFacts): boolean => facts.roles.includes('organiser')
export const mayStartRound = mayRunPanel
export const mayEditPanel = mayRunPanel
export const maySeePanelUnits = mayRunPanel

/** In the panel's list the units of an open round are kept from whoever only stewards or listens in it. */
export const mayKnowUnitsInUse = (facts: RoundFacts): boolean =>
  !isBlinded(facts) || mayOrganise(facts) || facts.roles.includes('keeper')
