import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { PanelForm } from '../components/PanelForm.tsx'
import { panelQuery } from '../queries.ts'

export default function SettingsPage() {
  const { panel: slug = '' } = useParams()
  const query = useQuery(panelQuery(slug))
  return (
    <Asked query={query} waiting="Reading the panel">
      {(panel) => (
        <Folio>
          <FolioSection
            label={panel.name}
            note={
              <p>
                Rules on disclosure, paid listeners and data protection differ by place. Scrim keeps a record
                of who knew what and when; local law and qualified advice decide what you must publish and
                keep.
              </p>
            }
          >
            <PageTitle>Settings</PageTitle>
            {panel.can.edit ? (
              <PanelForm key={panel.version} panel={panel} />
            ) : (
              <div className="mt-6">
                <Notice title={`${panel.name}, ${panel.timeZone}`}>
                  Only an organiser of the panel changes its name or time zone.
                </Notice>
              </div>
            )}
          </FolioSection>
        </Folio>
      )}
    </Asked>
  )
}
