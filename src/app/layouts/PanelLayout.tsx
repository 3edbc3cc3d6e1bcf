import { PageLayout } from './PageLayout.tsx'
import type { PageLayoutProps } from './PageLayout.tsx'

interface PanelLayoutProps extends Omit<PageLayoutProps, 'home'> {
  /** The panel's first page; the name on top leads there. */
  home: string
}

/** Inside a panel: its places on top, the panel and the person at the right. */
export function PanelLayout(props: PanelLayoutProps) {
  return <PageLayout {...props} />
}
