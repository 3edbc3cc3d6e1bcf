/** What a rule about a panel may look at. */
export interface PanelFacts {
  roles: readonly string[]
}

export const mayRunPanel = (facts: PanelFacts): boolean => facts.roles.includes('organiser')
export const mayStartRound = mayRunPanel
export const mayEditPanel = mayRunPanel
export const maySeePanelUnits = mayRunPanel
