import type { ReactNode } from 'react'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'

interface ListPageProps {
  title: string
  label: string
  action?: ReactNode
  note?: ReactNode
  children: ReactNode
}

/** A list of the panel: its name, the one verb, the list. */
export function ListPage({ title, label, action, note, children }: ListPageProps) {
  return (
    <Folio>
      <FolioSection label={label} note={note}>
        <PageTitle>{title}</PageTitle>
        {action && <div className="actions mt-6">{action}</div>}
        <div className="mt-8">{children}</div>
      </FolioSection>
    </Folio>
  )
}
