import * as contract from '#shared/contracts/panels.ts'
import { staleEdit } from '#server/http/api-error.ts'
import type { Feature } from '#server/http/feature.ts'
import { mayEditPanel, maySeePanelUnits, mayStartRound } from '#server/policies/panel.ts'
import { enterPanel, type PanelAccess } from './access-service.ts'
import { membersOfPanel, roundsOfPanel, unitsOfPanel } from './lists-service.ts'
import { presentMemberLine, presentPanel, presentRoundLine, presentUnitLine } from './presenter.ts'
import { changePanel } from './service.ts'

const panelOf = ({ panel, member }: PanelAccess) =>
  presentPanel(panel, member, {
    startRound: mayStartRound({ roles: member.roles }),
    edit: mayEditPanel({ roles: member.roles }),
    seeUnits: maySeePanelUnits({ roles: member.roles }),
  })

export const panels: Feature = (mount) => {
  mount(contract.getPanel, async ({ params }, context) => panelOf(await enterPanel(context, params.panel)))
  mount(contract.changePanel, async ({ params, body }, context) => {
    const changed = await changePanel(context, params.panel, body)
    if (changed.stale) throw staleEdit(panelOf(changed))
    return panelOf(changed)
  })
  mount(contract.listRounds, async ({ params }, context) => ({
    rounds: (await roundsOfPanel(context, params.panel)).map(presentRoundLine),
  }))
  mount(contract.listUnits, async ({ params }, context) => {
    const { units, withheld } = await unitsOfPanel(context, params.panel)
    return { units: units.map(presentUnitLine), withheld }
  })
  mount(contract.listMembers, async ({ params }, context) => ({
    members: (await membersOfPanel(context, params.panel)).map(presentMemberLine),
  }))
}
