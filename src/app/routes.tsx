import type { ComponentType } from 'react'
import type { RouteObject } from 'react-router-dom'
import { paths } from './paths.ts'
import { FirstLoad } from './Arriving.tsx'
import { BareFrame } from './BareFrame.tsx'
import { ErrorPage } from './ErrorPage.tsx'
import { NotFoundPage } from './NotFoundPage.tsx'
import { PanelFrame } from './PanelFrame.tsx'
import { PublicFrame } from './PublicFrame.tsx'

type Page = { default: ComponentType }

const page = (path: string, load: () => Promise<Page>): RouteObject => ({
  path,
  lazy: async () => ({ Component: (await load()).default }),
})

/** A frame, and its pages inside it: what fails in a page is said inside the frame. */
const framed = (frame: ComponentType, children: RouteObject[]): RouteObject => ({
  Component: frame,
  ErrorBoundary: ErrorPage,
  HydrateFallback: FirstLoad,
  children: [{ ErrorBoundary: ErrorPage, children }],
})

const publicPages = [
  page(paths.home.pattern, () => import('#src/features/verdicts/pages/HomePage.tsx')),
  page(paths.how.pattern, () => import('#src/features/how/pages/HowPage.tsx')),
  page(paths.verdict.pattern, () => import('#src/features/verdicts/pages/VerdictPage.tsx')),
  page(paths.verdictNumber.pattern, () => import('#src/features/verdicts/pages/VerdictPage.tsx')),
  page(paths.publicRound.pattern, () => import('#src/features/rounds/pages/PublicRoundPage.tsx')),
  page(paths.account.pattern, () => import('#src/features/account/pages/AccountPage.tsx')),
  page(paths.mailbox.pattern, () => import('#src/features/demo/pages/MailboxPage.tsx')),
  { path: '*', Component: NotFoundPage },
]

const barePages = [
  page(paths.signIn.pattern, () => import('#src/features/account/pages/SignInPage.tsx')),
  page(paths.signUp.pattern, () => import('#src/features/account/pages/SignUpPage.tsx')),
  page(paths.forgot.pattern, () => import('#src/features/account/pages/ForgotPage.tsx')),
  page(paths.reset.pattern, () => import('#src/features/account/pages/ResetPage.tsx')),
  page(paths.join.pattern, () => import('#src/features/seats/pages/JoinPage.tsx')),
  page(paths.seat.pattern, () => import('#src/features/seats/pages/SeatPage.tsx')),
  page(paths.reveal.pattern, () => import('#src/features/analysis/pages/RevealPage.tsx')),
]

const panelPages = [
  page(paths.panel.pattern, () => import('#src/features/panels/pages/DeskPage.tsx')),
  page(paths.units.pattern, () => import('#src/features/panels/pages/UnitsPage.tsx')),
  page(paths.people.pattern, () => import('#src/features/panels/pages/PeoplePage.tsx')),
  page(paths.settings.pattern, () => import('#src/features/panels/pages/SettingsPage.tsx')),
  page(paths.rounds.pattern, () => import('#src/features/panels/pages/RoundsPage.tsx')),
  page(paths.newRound.pattern, () => import('#src/features/rounds/pages/NewEveningPage.tsx')),
  page(paths.importRound.pattern, () => import('#src/features/imports/pages/ImportPage.tsx')),
  page(paths.editRound.pattern, () => import('#src/features/rounds/pages/EditEveningPage.tsx')),
  page(paths.plan.pattern, () => import('#src/features/rounds/pages/PlanPage.tsx')),
  page(paths.progress.pattern, () => import('#src/features/rounds/pages/ProgressPage.tsx')),
  page(paths.links.pattern, () => import('#src/features/rounds/pages/LinksPage.tsx')),
  page(paths.table.pattern, () => import('#src/features/table/pages/TablePage.tsx')),
  page(paths.tags.pattern, () => import('#src/features/tags/pages/TagsPage.tsx')),
  page(paths.agreement.pattern, () => import('#src/features/analysis/pages/AgreementPage.tsx')),
  page(paths.publish.pattern, () => import('#src/features/verdicts/pages/PublishPage.tsx')),
]

/** Every address and its page, each loaded when it is first opened. */
export const routes: RouteObject[] = [
  framed(PublicFrame, publicPages),
  framed(BareFrame, barePages),
  framed(PanelFrame, panelPages),
]
