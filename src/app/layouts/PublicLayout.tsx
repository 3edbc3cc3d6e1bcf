import { PageLayout } from './PageLayout.tsx'
import type { PageLayoutProps } from './PageLayout.tsx'

/** What anyone may read. The foot says the line under the name. */
export function PublicLayout(props: PageLayoutProps) {
  return <PageLayout {...props} foot={props.foot ?? 'Blind listening, openly reported.'} />
}
